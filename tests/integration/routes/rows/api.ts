import { PERMITTED } from '@/lib/auth/permissions';
import { ANYONE } from '@/lib/auth/roles';
import { newId } from '@/lib/ids';
import { recordBaseline } from '@/lib/services/baseline/record';
import { callCause } from '@/lib/services/case/call';
import { openCase } from '@/lib/services/case/open';
import { readCaseState } from '@/lib/services/case/read';
import { recordFinding } from '@/lib/services/case/record-finding';
import { createModel } from '@/lib/services/compressor-model/create';
import { hideModel } from '@/lib/services/compressor-model/hide';
import { createFit } from '@/lib/services/fit/create';
import { createUnit } from '@/lib/services/unit/create';
import { hideUnit } from '@/lib/services/unit/hide';
import { readUnit } from '@/lib/services/unit/read';
import { feature } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const SEE_UNITS = PERMITTED['unit.see'];
const EDIT_UNITS = PERMITTED['unit.edit'];
const EDIT_MODELS = PERMITTED['model.edit'];
const V1 = 'api/v1';

/** Without cautions, so that it can be answered at once. */
const CHECK = 'onset';
/** Whatever state it is in. */
const ANY = () => ({ 'if-match': '*' });

/** What scripts ask for; what the pages and a device ask for by the same routes is no different. */
export const api = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const ids = { caseId: newId(), calledId: newId(), unitId: newId(), hiddenUnitId: newId(), findingId: newId(), modelId: newId(), hiddenModelId: newId(), fitId: newId(), setId: newId() };
    const { caseId, calledId, unitId, hiddenUnitId, findingId, modelId, hiddenModelId, fitId, setId } = ids;
    for (const id of [modelId, hiddenModelId]) await createModel({ ctx: as('engineer'), input: { id, name: id, bore: '3 5/8' } });
    await hideModel({ ctx: as('engineer'), input: { modelId: hiddenModelId, reason: 'Out of use' } });
    const facts = { siteId: tenant.siteId, vehicleKind: 'truck' as const };
    await createUnit({ ctx, input: { id: unitId, fleetNumber: unitId, ...facts, reservoirs: '5000', odometer: '100', readOn: '2024-01-01' } });
    await createUnit({ ctx, input: { id: hiddenUnitId, fleetNumber: hiddenUnitId, ...facts } });
    await hideUnit({ ctx, input: { unitId: hiddenUnitId, reason: 'Sold' } });
    await createFit({ ctx, input: { id: fitId, unitId, modelId, condition: 'new', installedOn: '2024-02-01', installedOdometer: '200' } });
    await recordBaseline({ ctx, input: { id: setId, unitId, occasion: 'service', measuredOn: '2024-03-01', buildUp: '24' } });
    for (const id of [caseId, calledId]) await openCase({ ctx, input: { id, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
    await recordFinding({ ctx, input: { id: findingId, caseId, checkId: CHECK, answer: { kind: 'cannot-tell' }, deviceAt: ctx.now().toISOString() } });
    const { causes } = await readCaseState({ ctx, input: { caseId: calledId } });
    await callCause({ ctx, input: { id: newId(), caseId: calledId, mainCause: causes[0]?.causeId ?? '', sureness: 'guess' } });
    const { readings } = await readUnit({ ctx, input: { unitId } });
    return { ...ids, siteId: tenant.siteId, personId: ctx.person.id, readingId: readings[0]?.id ?? '' };
  },
  rows: [
    { page: '(public)/api/docs', roles: 'anybody' },
    { page: '(public)/api/docs/[group]', roles: 'anybody', params: () => ({ group: 'cases' }) },
    { route: `${V1}/openapi.json`, method: 'GET', roles: 'anybody' },
    { route: `${V1}/cases`, method: 'GET', roles: SEE, query: () => ({ status: 'all', mine: 'yes', limit: '1' }) },
    { route: `${V1}/cases`, method: 'POST', roles: WORK, body: ({ unitId }) => ({ id: newId(), unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] }) },
    { route: `${V1}/cases/[id]`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${V1}/cases/[id]/record`, method: 'GET', roles: SEE, params: ({ calledId }) => ({ id: calledId }) },
    { route: `${V1}/cases/[id]/reasons`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: `${V1}/cases/[id]/rulebook`, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    {
      route: `${V1}/cases/[id]/findings`,
      method: 'POST',
      roles: WORK,
      params: ({ caseId }) => ({ id: caseId }),
      body: () => ({ id: newId(), checkId: CHECK, answer: { kind: 'skip' }, deviceAt: new Date().toISOString() }),
    },
    {
      route: `${V1}/cases/[id]/findings/[findingId]/notes`,
      method: 'POST',
      roles: WORK,
      params: ({ caseId, findingId }) => ({ id: caseId, findingId }),
      body: () => ({ id: newId(), text: 'Black' }),
    },
    {
      route: `${V1}/cases/[id]/acknowledgements`,
      method: 'POST',
      roles: WORK,
      params: ({ caseId }) => ({ id: caseId }),
      body: () => ({ checkId: 'build-up-time', cautions: [{ id: newId(), cautionId: 'vehicle-rolls' }] }),
    },
    {
      route: `${V1}/cases/[id]/call`,
      method: 'POST',
      roles: WORK,
      params: ({ caseId }) => ({ id: caseId }),
      body: () => ({ id: newId(), mainCause: 'something-else', whyNotLeading: 'Seen', unlistedCause: 'A rag', sureness: 'sure' }),
    },
    { route: `${V1}/cases/[id]/reopen`, method: 'POST', roles: WORK, params: ({ calledId }) => ({ id: calledId }), body: () => ({ id: newId(), reason: 'Came back' }) },
    { route: `${V1}/cases/[id]/assign`, method: 'POST', roles: WORK, params: ({ caseId }) => ({ id: caseId }), body: ({ personId }) => ({ personId }) },

    { route: `${V1}/units`, method: 'GET', roles: SEE_UNITS, query: () => ({ q: '1', limit: '5' }) },
    { route: `${V1}/units`, method: 'POST', roles: EDIT_UNITS, body: ({ siteId }) => ({ id: newId(), fleetNumber: newId(), siteId, vehicleKind: 'bus', odometer: '410,000' }) },
    { route: `${V1}/units/[id]`, method: 'GET', roles: SEE_UNITS, params: ({ unitId }) => ({ id: unitId }) },
    {
      route: `${V1}/units/[id]`,
      method: 'PUT',
      roles: EDIT_UNITS,
      headers: ANY,
      params: ({ unitId }) => ({ id: unitId }),
      body: ({ siteId }) => ({ fleetNumber: newId(), siteId, vehicleKind: 'bus' }),
    },
    { route: `${V1}/units/[id]/hide`, method: 'POST', roles: EDIT_UNITS, params: ({ unitId }) => ({ id: unitId }), body: () => ({ reason: 'Sold' }) },
    { route: `${V1}/units/[id]/show`, method: 'POST', roles: EDIT_UNITS, params: ({ hiddenUnitId }) => ({ id: hiddenUnitId }), body: () => ({ reason: 'Back again' }) },
    { route: `${V1}/units/[id]/readings`, method: 'GET', roles: SEE_UNITS, params: ({ unitId }) => ({ id: unitId }), query: () => ({ limit: '1' }) },
    { route: `${V1}/units/[id]/readings`, method: 'POST', roles: EDIT_UNITS, params: ({ unitId }) => ({ id: unitId }), body: () => ({ readOn: '2025-01-01', odometer: '5,000 mi' }) },
    {
      route: `${V1}/units/[id]/readings/[readingId]/strike`,
      method: 'POST',
      roles: EDIT_UNITS,
      params: ({ unitId, readingId }) => ({ id: unitId, readingId }),
      body: () => ({ whyWrong: 'A nought too many' }),
    },
    { route: `${V1}/units/[id]/baseline`, method: 'GET', roles: SEE_UNITS, params: ({ unitId }) => ({ id: unitId }) },
    {
      route: `${V1}/units/[id]/baselines`,
      method: 'POST',
      roles: WORK,
      params: ({ unitId }) => ({ id: unitId }),
      body: () => ({ id: newId(), occasion: 'service', measuredOn: '2025-01-01', headTemperature: '150 °C', ambient: '20 °C', engineSpeed: '1,600 rpm', loadedFor: '10 min', oilCarried: '0.2 mL/h' }),
    },
    {
      route: `${V1}/units/[id]/baselines/[setId]/hide`,
      method: 'POST',
      roles: WORK,
      params: ({ unitId, setId }) => ({ id: unitId, setId }),
      body: () => ({ whyHidden: 'The gauge was wrong' }),
    },
    { route: `${V1}/units/[id]/fits`, method: 'GET', roles: SEE_UNITS, params: ({ unitId }) => ({ id: unitId }) },
    {
      route: `${V1}/units/[id]/fits`,
      method: 'POST',
      roles: EDIT_UNITS,
      params: ({ unitId }) => ({ id: unitId }),
      body: ({ modelId }) => ({ id: newId(), modelId, condition: 'rebuilt', installedOn: '2025-01-01', previousWhyOut: 'unknown' }),
    },
    { route: `${V1}/fits/[id]`, method: 'GET', roles: SEE_UNITS, params: ({ fitId }) => ({ id: fitId }) },
    {
      route: `${V1}/fits/[id]`,
      method: 'PUT',
      roles: EDIT_UNITS,
      headers: ANY,
      params: ({ fitId }) => ({ id: fitId }),
      body: ({ modelId }) => ({ modelId, condition: 'rebuilt', installedOn: '2024-02-01' }),
    },
    { route: `${V1}/fits/[id]/take-out`, method: 'POST', roles: EDIT_UNITS, headers: ANY, params: ({ fitId }) => ({ id: fitId }), body: () => ({ removedOn: '2025-01-01', whyOut: 'precaution' }) },
    { route: `${V1}/fits/[id]/strike`, method: 'POST', roles: EDIT_UNITS, params: ({ fitId }) => ({ id: fitId }), body: () => ({ reason: 'Wrong unit' }) },

    { route: `${V1}/models`, method: 'GET', roles: PERMITTED['model.see'], query: () => ({ q: '1', limit: '5' }) },
    { route: `${V1}/models`, method: 'POST', roles: EDIT_MODELS, body: () => ({ id: newId(), name: newId(), displacement: '19.4' }) },
    { route: `${V1}/models/[id]`, method: 'GET', roles: PERMITTED['model.see'], params: ({ modelId }) => ({ id: modelId }) },
    { route: `${V1}/models/[id]`, method: 'PUT', roles: EDIT_MODELS, headers: ANY, params: ({ modelId }) => ({ id: modelId }), body: () => ({ name: newId() }) },
    { route: `${V1}/models/[id]/hide`, method: 'POST', roles: EDIT_MODELS, params: ({ modelId }) => ({ id: modelId }), body: () => ({ reason: 'Out of use' }) },
    { route: `${V1}/models/[id]/show`, method: 'POST', roles: EDIT_MODELS, params: ({ hiddenModelId }) => ({ id: hiddenModelId }), body: () => ({ reason: 'Back again' }) },

    { route: `${V1}/sites`, method: 'GET', roles: ANYONE },
    { route: `${V1}/sites`, method: 'POST', roles: PERMITTED['site.manage'], body: () => ({ name: crypto.randomUUID(), timeZone: 'Europe/Lisbon' }) },
    { route: `${V1}/sites/[id]`, method: 'GET', roles: ANYONE, params: ({ siteId }) => ({ id: siteId }) },
    {
      route: `${V1}/sites/[id]`,
      method: 'PUT',
      roles: PERMITTED['site.manage'],
      headers: ANY,
      params: ({ siteId }) => ({ id: siteId }),
      body: () => ({ name: crypto.randomUUID(), timeZone: 'Europe/Lisbon' }),
    },

    { route: `${V1}/people`, method: 'GET', roles: SEE },
    { route: `${V1}/profile`, method: 'GET', roles: ANYONE },
    { route: `${V1}/profile/units`, method: 'PUT', roles: ANYONE, body: () => ({ pressure: 'bar' }) },
    { route: `${V1}/rulebook`, method: 'GET', roles: SEE },
  ],
});
