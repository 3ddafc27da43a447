import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { feature } from '../row';

const ANYBODY = PERMITTED['unit.see'];

export const search = feature({
  async prepare({ tenant, as }) {
    const [caseId, unitId] = [newId(), newId()];
    await openCase({
      ctx: as('technician'),
      input: { id: caseId, unit: { kind: 'new', id: unitId, fleetNumber: unitId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] },
    });
    return { caseId, unitId };
  },
  rows: [
    { page: '(signed-in)/search', roles: ANYBODY, query: () => ({ q: 'oil', read: 'check.onset' }) },
    { route: 'api/v1/search', method: 'GET', roles: ANYBODY, query: () => ({ q: 'oil', limit: '3' }) },
  ],
});
