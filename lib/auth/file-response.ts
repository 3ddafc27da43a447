import { notFound } from '@/lib/errors';
import type { PhotoFile } from '@/lib/services/photo/read';

/** Passes a photo on from storage. It came from somebody's device: a browser shall show it and nothing else. */
export async function fileResponse({ mediaType, open }: PhotoFile): Promise<Response> {
  const body = await open();
  if (!body) throw notFound('picture');
  // Node's arrays may lie in shared memory by their type; these never do.
  return new Response(body as BodyInit, {
    headers: {
      'content-type': mediaType,
      'content-disposition': 'inline',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "default-src 'none'; sandbox",
      'cache-control': 'private, max-age=31536000, immutable',
    },
  });
}
