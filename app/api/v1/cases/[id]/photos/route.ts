import { route } from '@/lib/auth/route';
import { photoList, photoStanding } from '@/lib/schemas/photo';
import { addPhoto } from '@/lib/services/photo/add';
import { listPhotos } from '@/lib/services/photo/list';

const params = { id: 'caseId' };

export const GET = route(listPhotos, { params, scope: 'cases:read', doc: { summary: 'List the photos of a case', answers: photoList } });

export const POST = route(addPhoto, {
  params,
  scope: 'cases:write',
  status: 201,
  doc: {
    summary: 'Announce a photo',
    description: 'The answer says where to upload it: post a form with all `fields` and, as its last part, the picture as `file` to `url`, within ten minutes. Then say that it arrived. Send the same request again for a new permission to upload.',
    answers: photoStanding,
  },
});
