import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { readCaseKit } from '@/lib/services/case/kit';
import { feature } from '../row';

const SEE = PERMITTED['case.see'];

/** What a device asks for, to go on without a connection. */
export const device = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const caseId = newId();
    await openCase({
      ctx,
      input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: caseId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] },
    });
    const { editionId } = await readCaseKit({ ctx, input: { caseId } });
    return { caseId, editionId };
  },
  rows: [
    { route: 'api/v1/device/cases', method: 'GET', roles: SEE },
    { route: 'api/v1/cases/[id]/kit', method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: 'api/v1/cases/[id]/events', method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: 'api/v1/editions/[id]', method: 'GET', roles: SEE, params: ({ editionId }) => ({ id: editionId }) },
  ],
});
