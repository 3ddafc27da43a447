import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { recordBaseline } from '@/lib/services/baseline/record';
import { createModel } from '@/lib/services/compressor-model/create';
import { createFit } from '@/lib/services/fit/create';
import { readFit } from '@/lib/services/fit/read';
import { createUnit } from '@/lib/services/unit/create';
import { hideUnit } from '@/lib/services/unit/hide';
import { readUnit, readUnitForm } from '@/lib/services/unit/read';
import { feature } from '../row';

const SEE = PERMITTED['unit.see'];
const WORK = PERMITTED['case.work'];
const EDIT = PERMITTED['unit.edit'];
const PAGES = '(signed-in)/units';

export const units = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [unitId, hiddenId, modelId, fitId, setId] = [newId(), newId(), newId(), newId(), newId()];
    await createModel({ ctx: as('engineer'), input: { id: modelId, name: modelId } });
    await createUnit({ ctx, input: { id: unitId, fleetNumber: unitId, siteId: tenant.siteId, vehicleKind: 'truck', odometer: '100', readOn: '2024-01-01' } });
    await createUnit({ ctx, input: { id: hiddenId, fleetNumber: hiddenId, siteId: tenant.siteId, vehicleKind: 'bus' } });
    await hideUnit({ ctx, input: { unitId: hiddenId, reason: 'Sold' } });
    await createFit({ ctx, input: { id: fitId, unitId, modelId, condition: 'new', installedOn: '2024-02-01', installedOdometer: '200' } });
    await recordBaseline({ ctx, input: { id: setId, unitId, occasion: 'service', measuredOn: '2024-03-01', buildUp: '24' } });
    const { readings } = await readUnit({ ctx, input: { unitId } });
    const { version } = await readUnitForm({ ctx, input: { unitId } });
    const { version: fitVersion } = await readFit({ ctx, input: { unitId, fitId } });
    return { siteId: tenant.siteId, unitId, hiddenId, modelId, fitId, setId, version, fitVersion, readingId: readings[0]?.id ?? '' };
  },
  rows: [
    { page: PAGES, roles: SEE, query: ({ siteId }) => ({ q: 'K', site: siteId, vocation: 'regional', kind: 'bus', hidden: 'yes', sort: 'site', direction: 'desc', page: '2' }) },
    { page: `${PAGES}/new`, roles: EDIT },
    { page: `${PAGES}/[id]`, roles: SEE, params: ({ unitId }) => ({ id: unitId }) },
    { page: `${PAGES}/[id]/edit`, roles: EDIT, params: ({ unitId }) => ({ id: unitId }) },
    { page: `${PAGES}/[id]/baseline`, roles: WORK, params: ({ unitId }) => ({ id: unitId }) },
    { page: `${PAGES}/[id]/readings/new`, roles: EDIT, params: ({ unitId }) => ({ id: unitId }) },
    { page: `${PAGES}/[id]/fits/new`, roles: EDIT, params: ({ unitId }) => ({ id: unitId }) },
    { page: `${PAGES}/[id]/fits/[fitId]`, roles: SEE, params: ({ unitId, fitId }) => ({ id: unitId, fitId }), query: () => ({ do: 'correct' }) },

    { action: PAGES, name: 'addUnit', roles: EDIT, form: ({ siteId }) => ({ id: newId(), fleetNumber: newId(), siteId, vehicleKind: 'truck', odometer: '410,000' }) },
    { action: PAGES, name: 'changeUnit', roles: EDIT, form: ({ unitId, version, siteId }) => ({ unitId, version, fleetNumber: newId(), siteId, vehicleKind: 'bus' }) },
    { action: PAGES, name: 'hideUnit', roles: EDIT, form: ({ unitId }) => ({ unitId, reason: 'Sold' }) },
    { action: PAGES, name: 'showUnit', roles: EDIT, form: ({ hiddenId }) => ({ unitId: hiddenId }) },
    { action: PAGES, name: 'addReading', roles: EDIT, form: ({ unitId }) => ({ unitId, readOn: '2025-01-01', odometer: '5,000 mi', engineHours: '100' }) },
    { action: PAGES, name: 'strikeReading', roles: EDIT, form: ({ unitId, readingId }) => ({ unitId, readingId, whyWrong: 'A nought too many' }) },
    { action: PAGES, name: 'recordBaseline', roles: WORK, form: ({ unitId }) => ({ id: newId(), unitId, occasion: 'proved-repair', measuredOn: '2025-01-01', buildUp: '24 s', buildUpError: '1' }) },
    { action: PAGES, name: 'hideBaseline', roles: WORK, form: ({ unitId, setId }) => ({ unitId, setId, whyHidden: 'The gauge was wrong' }) },
    { action: PAGES, name: 'addFit', roles: EDIT, form: ({ unitId, modelId }) => ({ id: newId(), unitId, modelId, condition: 'rebuilt', installedOn: '2025-01-01', previousWhyOut: 'unknown' }) },
    { action: PAGES, name: 'changeFit', roles: EDIT, form: ({ fitId, fitVersion, modelId }) => ({ fitId, version: fitVersion, modelId, condition: 'rebuilt', installedOn: '2024-02-01' }) },
    { action: PAGES, name: 'takeOutFit', roles: EDIT, form: ({ fitId, fitVersion }) => ({ fitId, version: fitVersion, removedOn: '2025-01-01', whyOut: 'precaution' }) },
    { action: PAGES, name: 'strikeFit', roles: EDIT, form: ({ fitId }) => ({ fitId, reason: 'Wrong unit' }) },
  ],
});
