import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { listGates } from '@/lib/services/gate/list';
import { makeGate } from '@/lib/services/gate/links';
import { enterGate } from '@/lib/services/gate/pass';
import { viewGatePage } from '@/lib/services/gate/view';
import { createUnit } from '@/lib/services/unit/create';
import { feature } from '../row';

const SITES = PERMITTED['site.manage'];
const FLEET = PERMITTED['fleet.see'];
const LINK = '(auth)/gate/[token]';
const PAGE = '(signed-in)/settings/sites';
const API = 'api/v1/sites/[id]/gates';

/** A gate, and a passage of it that stands at its first check. */
export const gates = feature({
  async prepare({ tenant, as }) {
    const [gateId, unitId, passageId, fleetNumber] = [newId(), newId(), newId(), newId().slice(-8)];
    const { siteId } = tenant;
    await createUnit({ ctx: as('technician'), input: { id: unitId, siteId, fleetNumber, country: 'US', vehicleKind: 'truck' } });
    await makeGate({ ctx: as('administrator'), input: { id: gateId, siteId, name: 'Parts counter', askWhom: 'the desk' } });
    const made = await listGates({ ctx: as('administrator'), input: { siteId } });
    const token = made.gates.find(({ id }) => id === gateId)?.path?.replace('/gate/', '') ?? '';
    const { db, now, jobs, signingSecret } = as('technician');
    const visitor = { db, now, jobs, signingSecret, network: newId() };
    await enterGate({ visitor, input: { token, id: passageId, fleetNumber, name: 'Kim', complaints: ['complaint-oil'] } });
    const page = await viewGatePage({ visitor, input: { token, passageId } });
    return { siteId, gateId, token, passageId, fleetNumber, checkId: page.step === 'check' ? page.check.id : '' };
  },
  rows: [
    { page: LINK, roles: 'anybody', params: ({ token }) => ({ token }), query: ({ passageId }) => ({ passage: passageId }) },
    { action: LINK, name: 'enter', roles: 'anybody', form: ({ token, fleetNumber }) => ({ token, id: newId(), fleetNumber, name: 'Kim', complaints: ['complaint-oil'] }) },
    { action: LINK, name: 'answer', roles: 'anybody', form: ({ token, passageId, checkId }) => ({ token, passageId, id: newId(), checkId, hasReadCautions: 'on', cannotTell: 'on' }) },
    { action: LINK, name: 'finish', roles: 'anybody', form: ({ token, passageId }) => ({ token, passageId }) },
    { page: `${PAGE}/[id]/gates/[gateId]`, roles: SITES, params: ({ siteId, gateId }) => ({ id: siteId, gateId }) },
    { action: PAGE, name: 'makeGate', roles: SITES, form: ({ siteId }) => ({ id: newId(), siteId, name: 'Counter', askWhom: 'the desk', days: '30' }) },
    { action: PAGE, name: 'revokeGate', roles: SITES, form: ({ siteId, gateId }) => ({ siteId, gateId }) },
    { page: '(signed-in)/fleet/gate', roles: FLEET },
    { route: 'api/v1/fleet/gate', method: 'GET', roles: FLEET },
    { route: API, method: 'GET', roles: SITES, params: ({ siteId }) => ({ id: siteId }) },
    { route: API, method: 'POST', roles: SITES, params: ({ siteId }) => ({ id: siteId }), body: () => ({ id: newId(), name: 'Counter', askWhom: 'the desk', days: 30 }) },
    { route: `${API}/[gateId]/revoke`, method: 'POST', roles: SITES, params: ({ siteId, gateId }) => ({ id: siteId, gateId }) },
  ],
});
