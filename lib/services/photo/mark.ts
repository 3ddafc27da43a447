import { lockAttachment, updateAttachment } from '@/db/queries/attachment';
import { updateCase } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { markPhotoInput } from '@/lib/schemas/photo';
import { defineWrite } from '../define';

/** Puts lines and words on a photo in place of those that were there; the picture stays as it is. */
export const markPhoto = defineWrite({
  name: 'mark.photo',
  doing: 'mark photos',
  roles: PERMITTED['case.work'],
  input: markPhotoInput,
  run: async ({ tx, ctx, input: { photoId, strokes, description }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, photoId };
    const photo = await lockAttachment(tx, of);
    if (photo?.state !== 'stored' || !photo.caseId) throw notFound('photo');
    const isSame = (photo.description ?? '') === description && JSON.stringify(photo.strokes) === JSON.stringify(strokes);
    if (isSame) unchanged();
    else {
      await updateAttachment(tx, of, { strokes, description: description || null });
      await updateCase(tx, { ...of, caseId: photo.caseId }, {});
      audit({ entity: 'photo', entityId: photoId, changed: { description, strokes } });
    }
    return { id: photoId, strokes, description };
  },
});
