import { notFound } from '@/lib/errors';
import type { PhotoFile } from '@/lib/services/photo/read';

/**
 * Passes a photo on from storage. It came from somebody's device: a browser shall show it and nothing else. A file with a
 * name is to be kept under it and not shown.
 */
export async function fileResponse({ mediaType, open, name }: PhotoFile & { name?: string }): Promise<Response> {
  const body = await open();
  if (!body) throw notFound('picture');
  // Node's arrays may lie in shared memory by their type; these never do.
  return new Response(body as BodyInit, {
    headers: {
      'content-type': mediaType,
      'content-disposition': name === undefined ? 'inline' : `attachment; filename="${name}"`,
      'x-content-type-options': 'nosniff',
      'content-security-policy': "default-src 'none'; sandbox",
      'cache-control': 'private, max-age=31536000, immutable',
    },
  });
}
