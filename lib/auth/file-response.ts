import { notFound } from '@/lib/errors';
import type { PhotoFile } from '@/lib/services/photo/read';

/** Passes a photo on from storage. It came from somebody's device: a browser shall show it and nothing else. */
export async function fileResponse({ mediaType, final, open }: PhotoFile): Promise<Response> {
  const body = await open();
  if (!body) throw notFound('picture');
  return new Response(body, {
    headers: {
      'content-type': mediaType,
      'content-disposition': 'inline',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "default-src 'none'; sandbox",
      'cache-control': final ? 'private, max-age=31536000, immutable' : 'private, no-cache',
    },
  });
}
