import { fileResponse } from '@/lib/auth/file-response';
import { route } from '@/lib/auth/route';
import { photoBytes } from '@/lib/schemas/photo';
import { readThumbnail } from '@/lib/services/photo/read';

export const GET = route(readThumbnail, {
  params: { id: 'photoId' },
  scope: 'cases:read',
  respond: fileResponse,
  shape: () => '',
  doc: { summary: 'The small copy of a photo', answers: photoBytes, mediaType: 'image/*' },
});
