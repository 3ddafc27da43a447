import { route } from '@/lib/auth/route';
import { photoHidden } from '@/lib/schemas/photo';
import { hidePhoto } from '@/lib/services/photo/hide';

export const PUT = route(hidePhoto, {
  params: { id: 'photoId' },
  scope: 'cases:write',
  doc: { summary: 'Hide a photo, or show it again', description: 'Nothing is deleted: who, when and why stay with it.', answers: photoHidden },
});
