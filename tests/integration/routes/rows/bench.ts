import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { feature } from '../row';

const USE = PERMITTED['bench.use'];

export const bench = feature({
  async prepare({ tenant, as }) {
    const caseId = newId();
    await openCase({
      ctx: as('technician'),
      input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: caseId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] },
    });
    return { caseId };
  },
  rows: [
    { page: '(signed-in)/bench', roles: USE },
    { page: '(signed-in)/bench/[sum]', roles: USE, params: () => ({ sum: 'leak-down' }), query: () => ({ volume: '3 ft3', 'volume.error': 'much', time: ['1 min', '2 min'], nonsense: 'x' }) },
    { page: '(signed-in)/bench/line-survey', roles: USE, query: () => ({ distance1: '0 ft', temperature1: 'hot', distance2: ['1 ft', '2 ft'], nonsense: 'x' }) },
    { route: 'api/v1/bench', method: 'GET', roles: USE },
    { route: 'api/v1/bench/[sum]', method: 'POST', roles: USE, params: () => ({ sum: 'time-loaded' }), body: () => ({ inputs: { loaded: { value: '90 s', error: '1 s' }, unloaded: { value: '10:30' } } }) },
  ],
});
