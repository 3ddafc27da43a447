import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { adoptLimit } from '@/lib/services/limit/adopt';
import { createUnit } from '@/lib/services/unit/create';
import { listHolds } from '@/lib/services/unit-hold/list';
import { give, no, yes } from '../../cases/support';
import { feature } from '../row';

const SEE = PERMITTED['limit.see'];
const ADOPT = PERMITTED['limit.adopt'];
const LIFT = PERMITTED['case.work'];
const PAGES = '(signed-in)/settings/limits';
const V1 = 'api/v1';

const CHECK = 'governor-span';
const limit = { checkId: CHECK, most: '30 psi', source: 'Our own figure' };

export const limits = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [limitId, unitId, caseId] = [newId(), newId(), newId()];
    await adoptLimit({ ctx: as('engineer'), input: { id: limitId, ...limit } });
    await createUnit({ ctx, input: { id: unitId, fleetNumber: unitId, siteId: tenant.siteId, vehicleKind: 'truck' } });
    await openCase({ ctx, input: { id: caseId, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
    for (const answer of [yes, no]) await give(ctx, { caseId, checkId: 'oil-in-service-tanks', answer });
    const { standing } = await listHolds({ ctx, input: { unitId } });
    return { limitId, unitId, holdId: standing[0]?.id ?? '' };
  },
  rows: [
    { page: PAGES, roles: SEE },
    { page: `${PAGES}/new`, roles: ADOPT, query: () => ({ check: 'cut-in-pressure', from: 'us-cut-in-truck' }) },
    { page: `${PAGES}/[id]`, roles: SEE, params: ({ limitId }) => ({ id: limitId }) },
    { action: PAGES, name: 'adoptLimit', roles: ADOPT, form: () => ({ id: newId(), ...limit, least: '', builtFrom: '1997-03-01', vehicleKind: 'truck' }) },
    { action: PAGES, name: 'withdrawLimit', roles: ADOPT, form: ({ limitId }) => ({ limitId, reason: 'Another is in force' }) },
    { action: '(signed-in)/units', name: 'liftHold', roles: LIFT, form: ({ unitId, holdId }) => ({ unitId, holdId, found: 'Dry after a week' }) },

    { route: `${V1}/limits`, method: 'GET', roles: SEE, query: () => ({ limit: '1' }) },
    { route: `${V1}/limits`, method: 'POST', roles: ADOPT, body: () => ({ id: newId(), ...limit }) },
    { route: `${V1}/limits/[id]/withdraw`, method: 'POST', roles: ADOPT, params: ({ limitId }) => ({ id: limitId }), body: () => ({ reason: 'Another is in force' }) },
    { route: `${V1}/units/[id]/holds`, method: 'GET', roles: PERMITTED['unit.see'], params: ({ unitId }) => ({ id: unitId }) },
    { route: `${V1}/units/[id]/holds/[holdId]/lift`, method: 'POST', roles: LIFT, params: ({ unitId, holdId }) => ({ id: unitId, holdId }), body: () => ({ found: 'Dry after a week' }) },
  ],
});
