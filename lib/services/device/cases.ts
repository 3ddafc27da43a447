import { z } from 'zod';
import { selectCasesToKeep, selectStoredPhotos } from '@/db/queries/device';
import { PERMITTED } from '@/lib/auth/permissions';
import { defineRead } from '../define';

/** More than anybody works on in a shift. */
const MOST_CASES = 12;

/** The open cases that the reader's device should keep, with the thumbnails of their photos. */
export const casesToKeep = defineRead({
  name: 'list.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: z.strictObject({}),
  run: async ({ tx, ctx }) => {
    const organisationId = ctx.organisation.id;
    const cases = await selectCasesToKeep(tx, { organisationId, personId: ctx.person.id, limit: MOST_CASES });
    const photos = await selectStoredPhotos(tx, { organisationId, caseIds: cases.map(({ id }) => id) });
    return {
      cases: cases.map(({ id, version }) => ({
        id,
        version,
        thumbnails: photos.filter(({ caseId }) => caseId === id).map((photo) => `/api/v1/photos/${photo.id}/thumbnail`),
      })),
    };
  },
});
