import { route } from '@/lib/auth/route';
import { photoStanding } from '@/lib/schemas/photo';
import { photoArrived } from '@/lib/services/photo/arrived';

export const POST = route(photoArrived, {
  params: { id: 'photoId' },
  scope: 'cases:write',
  doc: {
    summary: 'Say that a photo was uploaded',
    description: 'It is looked at before it counts, and rid of everything but the picture: places and times that the camera wrote into it go. A 409 asks for the upload again.',
    answers: photoStanding,
  },
});
