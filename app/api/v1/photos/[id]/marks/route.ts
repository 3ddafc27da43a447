import { route } from '@/lib/auth/route';
import { photoMarks } from '@/lib/schemas/photo';
import { markPhoto } from '@/lib/services/photo/mark';

export const PUT = route(markPhoto, {
  params: { id: 'photoId' },
  scope: 'cases:write',
  doc: { summary: 'Mark and describe a photo', description: 'In place of the marks and words that were there; the picture stays as it is.', answers: photoMarks },
});
