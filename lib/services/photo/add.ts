import { insertAttachment, selectAttachment } from '@/db/queries/attachment';
import { lockCase } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid, notFound } from '@/lib/errors';
import { addPhotoInput, type PhotoStanding } from '@/lib/schemas/photo';
import { defineWrite } from '../define';
import { compiledEdition } from '../edition/compiled';
import { arrivalKey, objectKey } from './object-key';
import { asState } from './state';

/**
 * Announces a photo of a case and says where to upload it. Repeated, it says so again as long as nothing arrived; of
 * what is stored or refused it says that. A record and no answer, so that a called case takes it too.
 */
export const addPhoto = defineWrite({
  name: 'add.photo',
  doing: 'add photos',
  roles: PERMITTED['case.work'],
  input: addPhotoInput,
  run: async ({ tx, ctx, input, audit, unchanged }): Promise<PhotoStanding> => {
    const organisationId = ctx.organisation.id;
    const head = await lockCase(tx, { organisationId, caseId: input.caseId });
    if (!head) throw notFound('case');
    if (input.checkId) {
      const { checks } = await compiledEdition(tx, { organisationId, editionId: head.editionId });
      if (!checks.has(input.checkId)) throw invalid({ checkId: "This check is not in the case's rulebook." });
    }
    const receivedAt = ctx.now();
    const written = await insertAttachment(tx, {
      organisationId,
      id: input.id,
      ownerKind: 'case',
      ownerId: input.caseId,
      caseId: input.caseId,
      checkId: input.checkId ?? null,
      place: input.place ?? null,
      objectKey: objectKey(organisationId, input.id),
      mediaType: input.mediaType,
      bytes: input.bytes,
      description: input.description || null,
      takenAt: new Date(Math.min(Date.parse(input.takenAt) + input.clockOffsetMs, receivedAt.getTime())),
      personId: ctx.person.id,
      createdAt: receivedAt,
    });
    if (written) audit({ entity: 'photo', entityId: input.id, changed: { caseId: input.caseId, checkId: input.checkId ?? null, description: input.description } });
    else unchanged();

    const photo = await selectAttachment(tx, { organisationId, photoId: input.id });
    if (photo?.caseId !== input.caseId) throw conflict('This id belongs to another photo.');
    const state = asState(photo.state);
    // What is kept may be smaller than what was sent; what is still to come may not.
    if (state === 'awaited' && photo.bytes !== input.bytes) throw conflict('This id belongs to another photo.');
    const upload = state === 'awaited' ? await ctx.storage.presignUpload(arrivalKey(organisationId, input.id), { maxBytes: photo.bytes, mediaType: photo.mediaType }) : null;
    return { id: input.id, state, refusal: photo.refusal, upload };
  },
});
