import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { startCatch } from '@/lib/services/oil-catch/start';
import { weigh } from '@/lib/services/oil-catch/weigh';
import { readCautions } from '@/tests/integration/cases/support';
import { feature, type Made } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PAGE = '(signed-in)/cases/[id]/catch';
const CATCHES = 'api/v1/cases/[id]/catches';
const CHECK = 'oil-caught';

const ofCatch = ({ caseId = '', catchId = '' }: Made) => ({ id: caseId, catchId });

/** One case with a bottle that hangs and was weighed, one without. */
export const catches = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [caseId, otherId, catchId, weighingId] = [newId(), newId(), newId(), newId()];
    for (const id of [caseId, otherId]) {
      await openCase({ ctx, input: { id, unit: { kind: 'new', id: newId(), fleetNumber: id, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
      await readCautions(ctx, id, CHECK);
    }
    await startCatch({ ctx, input: { id: catchId, caseId, checkId: CHECK, engineHours: '4,100', remindEveryDays: '2' } });
    await weigh({ ctx, input: { id: weighingId, caseId, catchId, oil: '12 g', engineHours: '4,120' } });
    return { caseId, otherId, catchId, weighingId };
  },
  rows: [
    { page: PAGE, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { action: PAGE, name: 'readCautions', roles: WORK, form: ({ caseId }) => ({ caseId, checkId: CHECK, cautions: ['vehicle-rolls'] }) },
    { action: PAGE, name: 'begin', roles: WORK, form: ({ otherId }) => ({ id: newId(), caseId: otherId, checkId: CHECK, engineHours: '4,100 h', place: 'left of the purge', remindEveryDays: '' }) },
    { action: PAGE, name: 'saveWeighing', roles: WORK, form: ({ caseId, catchId }) => ({ id: newId(), caseId, catchId, oil: '9 g', oilError: '1 g', engineHours: '4,131', hoursRun: '', note: 'black' }) },
    { action: PAGE, name: 'changeReminder', roles: WORK, form: ({ caseId, catchId }) => ({ caseId, catchId, remindEveryDays: '7' }) },
    { action: PAGE, name: 'takeBack', roles: WORK, form: ({ caseId, catchId, weighingId }) => ({ caseId, catchId, weighingId, whyTakenBack: 'The bottle was on the scale too' }) },
    { action: PAGE, name: 'takeDown', roles: WORK, form: ({ caseId, catchId }) => ({ caseId, catchId, whyEnded: '' }) },

    { route: CATCHES, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: CATCHES, method: 'POST', roles: WORK, params: ({ otherId }) => ({ id: otherId }), body: () => ({ id: newId(), checkId: CHECK, engineHours: '4,100' }) },
    { route: `${CATCHES}/[catchId]/weighings`, method: 'POST', roles: WORK, params: ofCatch, body: () => ({ id: newId(), oil: '0.4 oz', hoursRun: '9 h' }) },
    { route: `${CATCHES}/[catchId]/weighings/[weighingId]/take-back`, method: 'POST', roles: WORK, params: (made) => ({ ...ofCatch(made), weighingId: made.weighingId ?? '' }), body: () => ({ whyTakenBack: 'Mistyped' }) },
    { route: `${CATCHES}/[catchId]/reminder`, method: 'POST', roles: WORK, params: ofCatch, body: () => ({ remindEveryDays: '3' }) },
    { route: `${CATCHES}/[catchId]/end`, method: 'POST', roles: WORK, params: ofCatch, body: () => ({ whyEnded: 'Enough' }) },
  ],
});
