import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { announce, send, smallJpeg, upload } from '@/tests/integration/photos/support';
import { storage } from '@/lib/storage/of-environment';
import { feature } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PHOTO = 'api/v1/photos/[id]';

export const photos = feature({
  async prepare({ tenant, as }) {
    // The storage that the routes have, so that what is put there is found by them.
    const ctx = { ...as('technician'), storage: storage() };
    const caseId = newId();
    await openCase({ ctx, input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: caseId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
    const jpeg = await smallJpeg(40, 30);
    const { id: photoId } = await send(ctx, jpeg, { caseId });
    const awaited = await announce(ctx, jpeg, { caseId });
    await upload(awaited, jpeg);
    return { caseId, photoId, awaitedId: awaited.id };
  },
  rows: [
    { route: 'api/v1/cases/[id]/photos', method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    {
      route: 'api/v1/cases/[id]/photos',
      method: 'POST',
      roles: WORK,
      params: ({ caseId }) => ({ id: caseId }),
      body: () => ({ id: newId(), checkId: 'onset', mediaType: 'image/jpeg', bytes: 1000, takenAt: new Date().toISOString(), clockOffsetMs: 0, description: 'Black' }),
    },
    { route: `${PHOTO}/arrived`, method: 'POST', roles: WORK, params: ({ awaitedId }) => ({ id: awaitedId }) },
    { route: `${PHOTO}/picture`, method: 'GET', roles: SEE, params: ({ photoId }) => ({ id: photoId }) },
    { route: `${PHOTO}/thumbnail`, method: 'GET', roles: SEE, params: ({ photoId }) => ({ id: photoId }) },
    { route: `${PHOTO}/marks`, method: 'PUT', roles: WORK, params: ({ photoId }) => ({ id: photoId }), body: () => ({ strokes: [{ points: [[0.1, 0.1]] }], description: 'Here' }) },
    { route: `${PHOTO}/hidden`, method: 'PUT', roles: WORK, params: ({ photoId }) => ({ id: photoId }), body: () => ({ hidden: true, reason: 'Wrong truck' }) },
  ],
});
