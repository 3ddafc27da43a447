import { fileResponse } from '@/lib/auth/file-response';
import { route } from '@/lib/auth/route';
import { photoBytes } from '@/lib/schemas/photo';
import { readPicture } from '@/lib/services/photo/read';

export const GET = route(readPicture, {
  params: { id: 'photoId' },
  scope: 'cases:read',
  respond: fileResponse,
  shape: () => '',
  doc: { summary: 'The picture of a photo', answers: photoBytes, mediaType: 'image/*' },
});
