import { asTenant } from '@/db/connect';
import { lockAttachment, selectAttachment, updateAttachment } from '@/db/queries/attachment';
import { updateCase } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, notFound } from '@/lib/errors';
import { photoInput, type PhotoStanding } from '@/lib/schemas/photo';
import { MOST_PHOTO_BYTES } from '@/lib/schemas/photo-limits';
import type { Ctx } from '../context';
import { defineWrite } from '../define';
import { arrivalKey } from './object-key';
import { lookAt, type Looked } from './picture';
import { asState } from './state';

/**
 * Says that a photo was uploaded. What arrived is looked at, and what may be kept of it is put in its place; what
 * can't be kept is removed, and the row says why. Repeated, it tells what came of it.
 */
export const photoArrived = defineWrite({
  name: 'store.photo',
  doing: 'add photos',
  roles: PERMITTED['case.work'],
  input: photoInput,
  // Fetching and decoding take longer than a row should stay locked; doing them twice comes to the same.
  prepare: ({ ctx, input }) => keepWhatArrived(ctx, input.photoId),
  run: async ({ tx, ctx, input: { photoId }, prepared: looked, audit, unchanged }): Promise<PhotoStanding> => {
    const of = { organisationId: ctx.organisation.id, photoId };
    const photo = await lockAttachment(tx, of);
    if (!photo?.caseId) throw notFound('photo');
    if (photo.state !== 'awaited' || looked === undefined) {
      unchanged();
      return { id: photoId, state: asState(photo.state), refusal: photo.refusal, upload: null };
    }
    if (looked.ok) {
      const { body, width, height } = looked;
      await updateAttachment(tx, of, { state: 'stored', bytes: body.byteLength, width, height });
      await ctx.jobs.send(tx, 'make-thumbnail', of);
      await updateCase(tx, { ...of, caseId: photo.caseId }, {});
    } else {
      await updateAttachment(tx, of, { state: 'refused', refusal: looked.why });
    }
    const state = looked.ok ? 'stored' : 'refused';
    const refusal = looked.ok ? null : looked.why;
    audit({ entity: 'photo', entityId: photoId, changed: { state, ...(refusal && { refusal }) } });
    return { id: photoId, state, refusal, upload: null };
  },
});

/** @returns undefined when there is nothing to look at any more */
async function keepWhatArrived({ db, organisation, storage }: Ctx, photoId: string): Promise<Looked | undefined> {
  const of = { organisationId: organisation.id, photoId };
  const photo = await asTenant(db, of, (tx) => selectAttachment(tx, of));
  if (photo?.state !== 'awaited') return undefined;

  const key = arrivalKey(of.organisationId, photoId);
  const arrived = await storage.head(key);
  if (!arrived) {
    // Unless the same request, sent twice, has just taken it from there.
    const now = await asTenant(db, of, (tx) => selectAttachment(tx, of));
    if (now?.state !== 'awaited') return undefined;
    throw conflict('The photo has not arrived yet. Upload it first.');
  }
  const looked = await lookAtArrival(arrived.bytes, photo, () => storage.get(key));
  if (looked.ok) await storage.put(photo.objectKey, looked.body, photo.mediaType);
  await storage.remove(key);
  return looked;
}

/** Not every server keeps the limits that a permission to upload sets. */
async function lookAtArrival(bytes: number, announced: { bytes: number; mediaType: string }, fetch: () => Promise<Uint8Array | undefined>): Promise<Looked> {
  if (bytes > MOST_PHOTO_BYTES) return { ok: false, why: `This photo holds more than ${MOST_PHOTO_BYTES / 1024 / 1024} MB. Make it smaller first.` };
  const body = await fetch();
  // Part of a photo is no refusal: the device still has the whole of it.
  if (body?.byteLength !== announced.bytes) throw conflict('The photo did not arrive whole. Upload it again.');
  return lookAt(body, announced.mediaType);
}
