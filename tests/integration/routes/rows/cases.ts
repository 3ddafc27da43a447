import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { callCause } from '@/lib/services/case/call';
import { openCase } from '@/lib/services/case/open';
import { readCaseState } from '@/lib/services/case/read';
import { recordFinding } from '@/lib/services/case/record-finding';
import { saveView } from '@/lib/services/saved-view/save';
import { feature } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PAGES = '(signed-in)/cases';

/** Without cautions, so that it can be answered at once. */
const CHECK = 'onset';

export const cases = feature({
  async prepare({ tenant, as }) {
    const ctx = as('technician');
    const [caseId, calledId, unitId, findingId, viewId] = [newId(), newId(), newId(), newId(), newId()];
    await saveView({ ctx, input: { id: viewId, list: 'cases', name: viewId, query: 'held=yes' } });
    const newUnit = (id: string) => ({ kind: 'new' as const, id, fleetNumber: id, siteId: tenant.siteId, vehicleKind: 'truck' as const });
    await openCase({ ctx, input: { id: caseId, unit: newUnit(unitId), complaints: ['complaint-oil'] } });
    await openCase({ ctx, input: { id: calledId, unit: newUnit(newId()), complaints: ['complaint-oil'] } });
    await recordFinding({ ctx, input: { id: findingId, caseId, checkId: CHECK, answer: { kind: 'cannot-tell' }, deviceAt: ctx.now().toISOString() } });
    const { causes } = await readCaseState({ ctx, input: { caseId: calledId } });
    await callCause({ ctx, input: { id: newId(), caseId: calledId, mainCause: causes[0]?.causeId ?? '', sureness: 'guess' } });
    return { siteId: tenant.siteId, personId: ctx.person.id, caseId, calledId, unitId, findingId, viewId, leader: causes[0]?.causeId ?? '' };
  },
  rows: [
    { page: PAGES, roles: SEE, query: ({ siteId }) => ({ q: 'K', site: siteId, status: 'all', whose: 'me', held: 'yes', complaint: 'complaint-oil', sort: 'unit', direction: 'asc', page: '2' }) },
    { page: `${PAGES}/new`, roles: WORK, query: ({ unitId }) => ({ unit: unitId }) },
    { page: `${PAGES}/[id]`, roles: SEE, params: ({ caseId }) => ({ id: caseId }), query: () => ({ at: new Date().toISOString() }) },
    { page: `${PAGES}/[id]/history`, roles: SEE, params: ({ caseId }) => ({ id: caseId }), query: () => ({ at: new Date().toISOString(), with: 'nonsense' }) },

    {
      action: PAGES,
      name: 'openCaseFromForm',
      roles: WORK,
      form: ({ unitId }) => ({ id: newId(), newUnitId: newId(), unitId, fleetNumber: 'any', complaints: 'complaint-oil', odometer: '410,000' }),
    },
    { action: PAGES, name: 'saveViewFromForm', roles: SEE, form: () => ({ id: newId(), list: 'cases', name: newId(), query: 'status=closed' }) },
    { action: PAGES, name: 'renameViewFromForm', roles: SEE, form: ({ viewId }) => ({ id: viewId, name: newId() }) },
    { action: PAGES, name: 'removeViewFromForm', roles: SEE, form: ({ viewId }) => ({ id: viewId }) },
    { action: `${PAGES}/[id]`, name: 'callFromForm', roles: WORK, form: ({ caseId }) => ({ id: newId(), caseId, mainCause: 'something-else', whyNotLeading: 'Seen', unlistedCause: 'A rag', sureness: 'sure' }) },
    { action: `${PAGES}/[id]`, name: 'reopenFromForm', roles: WORK, form: ({ calledId }) => ({ id: newId(), caseId: calledId, reason: 'Came back' }) },
    { action: `${PAGES}/[id]`, name: 'assignFromForm', roles: WORK, form: ({ caseId, personId }) => ({ caseId, personId }) },
  ],
});
