import { selectRemovalsOfCase, selectStoredOfCase } from '@/db/queries/attachment';
import { selectCaseHead } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { photosOfCaseInput, type PhotoList } from '@/lib/schemas/photo';
import { defineRead } from '../define';
import { photoView } from './view';

/** Far more than anybody looks through. */
const MOST = 1000;

/** The stored photos of a case, as they were taken; hidden ones say so. */
export const listPhotos = defineRead({
  name: 'list.photos',
  doing: 'see photos',
  roles: PERMITTED['case.see'],
  input: photosOfCaseInput,
  run: async ({ tx, ctx, input }): Promise<PhotoList> => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    if (!(await selectCaseHead(tx, of))) throw notFound('case');
    const removals = new Map((await selectRemovalsOfCase(tx, of)).map((removal) => [removal.photoId, removal]));
    const rows = await selectStoredOfCase(tx, { ...of, limit: MOST });
    return { photos: rows.map((row) => photoView(row, removals.get(row.id))) };
  },
});
