import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { fileClaim } from '@/lib/services/claim/claim';
import { sendCore } from '@/lib/services/claim/core';
import { feature } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PAGE = '(signed-in)/cases/[id]/claim';
const CASE = 'api/v1/cases/[id]';
const LONG_AGO = '2020-03-02';

/** A case with a claim and a core that wait for their answers. */
export const claims = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [caseId, claimId, coreId] = [newId(), newId(), newId()];
    await openCase({ ctx, input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: caseId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
    await fileClaim({ ctx, input: { id: claimId, caseId, toWhom: 'The desk', theirReference: '', sentOn: LONG_AGO, amount: '480' } });
    await sendCore({ ctx, input: { id: coreId, caseId, whichFit: '', toWhom: 'The desk', sentOn: LONG_AGO, expectedAmount: '' } });
    return { caseId, claimId, coreId };
  },
  rows: [
    { page: PAGE, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { action: PAGE, name: 'keepClaim', roles: WORK, form: ({ caseId }) => ({ id: newId(), caseId, toWhom: 'A supplier', theirReference: 'RMA 7', sentOn: LONG_AGO, amount: '98,50' }) },
    { action: PAGE, name: 'endClaim', roles: WORK, form: ({ caseId, claimId }) => ({ caseId, claimId, state: 'part-paid', settledOn: LONG_AGO, settledAmount: '200', why: 'Labour is not covered' }) },
    { action: PAGE, name: 'keepCore', roles: WORK, form: ({ caseId }) => ({ id: newId(), caseId, whichFit: '', toWhom: 'A supplier', sentOn: LONG_AGO, expectedAmount: '120' }) },
    { action: PAGE, name: 'endCore', roles: WORK, form: ({ caseId, coreId }) => ({ caseId, coreId, state: 'refused', settledOn: LONG_AGO, creditedAmount: '', why: 'Cracked' }) },

    { route: `${CASE}/claims`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${CASE}/claims`, method: 'POST', roles: WORK, params: ({ caseId }) => ({ id: caseId }), body: () => ({ id: newId(), toWhom: 'A supplier', sentOn: LONG_AGO, amount: 98.5 }) },
    { route: `${CASE}/claims/[claimId]/settle`, method: 'POST', roles: WORK, params: ({ caseId, claimId }) => ({ id: caseId, claimId }), body: () => ({ state: 'denied', settledOn: LONG_AGO, why: 'Out of warranty' }) },
    { route: `${CASE}/cores`, method: 'POST', roles: WORK, params: ({ caseId }) => ({ id: caseId }), body: () => ({ id: newId(), toWhom: 'A supplier', sentOn: LONG_AGO, expectedAmount: 120 }) },
    { route: `${CASE}/cores/[coreId]/settle`, method: 'POST', roles: WORK, params: ({ caseId, coreId }) => ({ id: caseId, coreId }), body: () => ({ state: 'credited', settledOn: LONG_AGO, creditedAmount: 120 }) },
  ],
});
