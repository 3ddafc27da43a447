import { lockAttachment } from '@/db/queries/attachment';
import { updateCase } from '@/db/queries/case';
import { insertRemoval, selectLastRemoval } from '@/db/queries/removal';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { hidePhotoInput } from '@/lib/schemas/photo';
import { defineWrite } from '../define';

/** Takes a photo out of sight or brings it back, with who and why; nothing is deleted. */
export const hidePhoto = defineWrite({
  name: 'hide.photo',
  doing: 'hide photos',
  roles: PERMITTED['case.work'],
  input: hidePhotoInput,
  run: async ({ tx, ctx, input: { photoId, hidden, reason }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, photoId };
    const photo = await lockAttachment(tx, of);
    if (photo?.state !== 'stored' || !photo.caseId) throw notFound('photo');
    const last = await selectLastRemoval(tx, { organisationId: of.organisationId, entity: 'photo', entityId: photoId });
    if ((last?.kind === 'hide') === hidden) unchanged();
    else {
      const at = ctx.now();
      const kind = hidden ? 'hide' : 'show';
      await insertRemoval(tx, { organisationId: of.organisationId, id: newId(at.getTime()), entity: 'photo', entityId: photoId, kind, reason, personId: ctx.person.id, at });
      await updateCase(tx, { ...of, caseId: photo.caseId }, {});
      audit({ entity: 'photo', entityId: photoId, changed: { hidden, reason } });
    }
    return { id: photoId, hidden };
  },
});
