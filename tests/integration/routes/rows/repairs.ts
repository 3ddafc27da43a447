import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { chooseRepair } from '@/lib/services/repair/choose';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { readCautions } from '@/tests/integration/cases/support';
import { feature, type Made } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PAGE = '(signed-in)/cases/[id]/repair';
const CASE = 'api/v1/cases/[id]';
const CHECK = 'oil-in-wet-tank';

const ofRepair = ({ caseId = '', repairId = '' }: Made) => ({ id: caseId, repairId });

/** A case with one repair at hand, whose cautions were read. */
export const repairs = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [caseId, repairId] = [newId(), newId()];
    await openCase({ ctx, input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: caseId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
    const [first, second] = (await readRepairPlan({ ctx, input: { caseId } })).remedies;
    const remedyId = first?.remedyId ?? '';
    await acknowledgeRepair({ ctx, input: { caseId, remedyId, cautions: (first?.toRead ?? []).map((cautionId) => ({ id: newId(), cautionId })) } });
    await readCautions(ctx, caseId, CHECK);
    await chooseRepair({ ctx, input: { id: repairId, caseId, remedyId } });
    return { caseId, repairId, remedyId, caution: first?.cautions[0]?.id ?? '', otherRemedy: second?.remedyId ?? '', personId: ctx.person.id };
  },
  rows: [
    { page: PAGE, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { action: PAGE, name: 'readRepairCautions', roles: WORK, form: ({ caseId, remedyId, caution }) => ({ caseId, remedyId, cautions: [caution] }) },
    { action: PAGE, name: 'readCheckCautions', roles: WORK, form: ({ caseId }) => ({ caseId, checkId: CHECK, cautions: ['oil-mist-and-noise'] }) },
    { action: PAGE, name: 'see', roles: WORK, form: ({ caseId }) => ({ id: newId(), caseId, checkId: CHECK, stage: 'after-remedy', remedy: '1', kind: 'state', state: 'yes', sureness: 'sure' }) },
    { action: PAGE, name: 'choose', roles: WORK, form: ({ caseId, otherRemedy, personId }) => ({ id: newId(), caseId, remedyId: otherRemedy, whyBefore: 'Seen', plannedOn: '2026-03-03', assignedTo: personId }) },
    { action: PAGE, name: 'planIt', roles: WORK, form: ({ caseId, repairId, personId }) => ({ caseId, repairId, plannedOn: '2026-03-04', assignedTo: personId }) },
    { action: PAGE, name: 'saySo', roles: WORK, form: ({ caseId, repairId }) => ({ id: newId(), caseId, repairId, step: '0', mark: 'done', value: '30 lb·ft', note: 'by the maker’s sheet' }) },
    { action: PAGE, name: 'endIt', roles: WORK, form: ({ caseId, repairId }) => ({ caseId, repairId, outcome: 'dropped', whyDropped: 'Another fault' }) },

    { route: `${CASE}/repair-plan`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${CASE}/repair-plan/cautions`, method: 'POST', roles: WORK, params: ({ caseId }) => ({ id: caseId }), body: ({ remedyId, caution }) => ({ remedyId, cautions: [{ id: newId(), cautionId: caution }] }) },
    { route: `${CASE}/repairs`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${CASE}/repairs`, method: 'POST', roles: WORK, params: ({ caseId }) => ({ id: caseId }), body: ({ otherRemedy }) => ({ id: newId(), remedyId: otherRemedy, whyBefore: 'Seen' }) },
    { route: `${CASE}/repairs/[repairId]/plan`, method: 'POST', roles: WORK, params: ofRepair, body: ({ personId }) => ({ plannedOn: '2026-03-05', assignedTo: personId }) },
    { route: `${CASE}/repairs/[repairId]/steps`, method: 'POST', roles: WORK, params: ofRepair, body: () => ({ id: newId(), step: 0, mark: 'not-applicable', note: 'No such part' }) },
    { route: `${CASE}/repairs/[repairId]/end`, method: 'POST', roles: WORK, params: ofRepair, body: () => ({ outcome: 'dropped', whyDropped: 'Sold' }) },
  ],
});
