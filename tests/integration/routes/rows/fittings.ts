import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { startBreakIn, endBreakIn } from '@/lib/services/break-in/run';
import { openCase } from '@/lib/services/case/open';
import { answerAll, beginFitting, makeModel, measureForRelease, readWork } from '@/tests/integration/cases/repair-support';
import { readCautions } from '@/tests/integration/cases/support';
import { feature, type Made } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const FITTING = '(signed-in)/cases/[id]/fitting';
const BREAK_IN = '(signed-in)/cases/[id]/break-in';
const RELEASE = '(signed-in)/cases/[id]/release';
const CASE = 'api/v1/cases/[id]';
const CAUTION = defaultRulebook.proof?.fitting.cautions[0] ?? '';

const ofFitting = ({ caseId = '', fittingId = '' }: Made) => ({ id: caseId, fittingId });
const ofRun = ({ caseId = '', runId = '' }: Made) => ({ id: caseId, runId });
const ofEndedRun = ({ readyId = '', endedId = '' }: Made) => ({ id: readyId, runId: endedId });

/** A case with a fitting and a run under way, one where nothing has begun, and one that is ready to be released. */
export const fittings = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [caseId, otherId, readyId, runId, endedId] = [newId(), newId(), newId(), newId(), newId()];
    const installedOn = siteDay(ctx.now(), 'America/Chicago');
    const modelId = await makeModel(as('engineer'));
    for (const id of [caseId, otherId, readyId]) {
      await openCase({ ctx, input: { id, unit: { kind: 'new', id: newId(), fleetNumber: id, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
      await readWork(ctx, id, 'fitting');
      await readWork(ctx, id, 'break-in');
    }
    const { fittingId } = await beginFitting(ctx, { caseId, modelId, installedOn });
    await answerAll(ctx, { caseId, fittingId });
    await startBreakIn({ ctx, input: { id: runId, caseId } });
    await beginFitting(ctx, { caseId: readyId, modelId, installedOn });
    await startBreakIn({ ctx, input: { id: endedId, caseId: readyId } });
    await endBreakIn({ ctx, input: { caseId: readyId, runId: endedId, outcome: 'stopped', whyStopped: 'Rain' } });
    await measureForRelease(ctx, readyId);
    await readCautions(ctx, caseId, 'cut-out-pressure');
    return { caseId, otherId, readyId, runId, endedId, fittingId, modelId, installedOn };
  },
  rows: [
    { page: FITTING, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { action: FITTING, name: 'readCautions', roles: WORK, form: ({ otherId }) => ({ caseId: otherId, work: 'fitting', cautions: [CAUTION] }) },
    { action: FITTING, name: 'begin', roles: WORK, form: ({ otherId, modelId, installedOn }) => ({ id: newId(), newFitId: newId(), caseId: otherId, modelId, condition: 'new', installedOn }) },
    { action: FITTING, name: 'sayOfPoint', roles: WORK, form: ({ caseId, fittingId }) => ({ id: newId(), caseId, fittingId, pointId: 'sealant', answer: 'thin-film' }) },
    { action: FITTING, name: 'finish', roles: WORK, form: ({ caseId, fittingId }) => ({ caseId, fittingId }) },
    { page: BREAK_IN, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { action: BREAK_IN, name: 'readCautions', roles: WORK, form: ({ otherId }) => ({ caseId: otherId, work: 'break-in', cautions: ['exhaust-fumes'] }) },
    { action: BREAK_IN, name: 'begin', roles: WORK, form: ({ readyId }) => ({ id: newId(), caseId: readyId }) },
    { action: BREAK_IN, name: 'end', roles: WORK, form: ({ caseId, runId }) => ({ caseId, runId, outcome: 'stopped', whyStopped: 'Rain' }) },
    { action: BREAK_IN, name: 'saveHotCheck', roles: WORK, form: ({ readyId, endedId }) => ({ caseId: readyId, runId: endedId, oil: 'leak', coolant: 'none', where: 'at the flange' }) },
    { page: RELEASE, roles: SEE, params: ({ readyId }) => ({ id: readyId }) },
    { action: RELEASE, name: 'readCautions', roles: WORK, form: ({ otherId }) => ({ caseId: otherId, checkId: 'low-air-warning', cautions: ['vehicle-rolls'] }) },
    { action: RELEASE, name: 'measure', roles: WORK, form: ({ caseId }) => ({ id: newId(), caseId, checkId: 'cut-out-pressure', stage: 'release', kind: 'measured', value: '125 psi', sureness: 'sure' }) },
    { action: RELEASE, name: 'release', roles: WORK, form: ({ readyId }) => ({ id: newId(), caseId: readyId, note: 'on the road again' }) },

    { route: `${CASE}/work-cautions`, method: 'POST', roles: WORK, params: ({ otherId }) => ({ id: otherId }), body: () => ({ work: 'fitting', cautions: [{ id: newId(), cautionId: CAUTION }] }) },
    { route: `${CASE}/fittings`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${CASE}/fittings`, method: 'POST', roles: WORK, params: ({ otherId }) => ({ id: otherId }), body: ({ modelId, installedOn }) => ({ id: newId(), newFitId: newId(), modelId, condition: 'rebuilt', installedOn }) },
    { route: `${CASE}/fittings/[fittingId]/points`, method: 'POST', roles: WORK, params: ofFitting, body: () => ({ id: newId(), pointId: 'governor', answer: 'changed' }) },
    { route: `${CASE}/fittings/[fittingId]/finish`, method: 'POST', roles: WORK, params: ofFitting },
    { route: `${CASE}/break-ins`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${CASE}/break-ins`, method: 'POST', roles: WORK, params: ({ readyId }) => ({ id: readyId }), body: () => ({ id: newId() }) },
    { route: `${CASE}/break-ins/[runId]/events`, method: 'POST', roles: WORK, params: ofRun, body: () => ({ id: newId(), kind: 'reading', pressure: '80 psi' }) },
    { route: `${CASE}/break-ins/[runId]/end`, method: 'POST', roles: WORK, params: ofRun, body: () => ({ outcome: 'stopped', whyStopped: 'Rain' }) },
    { route: `${CASE}/break-ins/[runId]/hot-check`, method: 'POST', roles: WORK, params: ofEndedRun, body: () => ({ oil: 'none', coolant: 'none' }) },
    { route: `${CASE}/release`, method: 'GET', roles: SEE, params: ({ readyId }) => ({ id: readyId }) },
    { route: `${CASE}/releases`, method: 'POST', roles: WORK, params: ({ readyId }) => ({ id: readyId }), body: () => ({ id: newId() }) },
  ],
});
