import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { filtersOf } from '@/lib/schemas/saved-view';
import { assignCase } from '@/lib/services/case/assign';
import { listCases } from '@/lib/services/case/list';
import { openCase } from '@/lib/services/case/open';
import { readCase } from '@/lib/services/case/read';
import { listSavedViews } from '@/lib/services/saved-view/list';
import { removeView } from '@/lib/services/saved-view/remove';
import { renameView } from '@/lib/services/saved-view/rename';
import { saveView } from '@/lib/services/saved-view/save';
import { listUnits } from '@/lib/services/unit/list';
import { liftHold } from '@/lib/services/unit-hold/lift';
import { readUnit } from '@/lib/services/unit/read';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, no, yes } from './support';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

async function openOn({ ctx, siteId }: Tenant, fleetNumber: string, complaint = 'complaint-oil') {
  const id = newId();
  const unitId = newId();
  await openCase({ ctx, input: { id, unit: { kind: 'new', id: unitId, fleetNumber, siteId, vehicleKind: 'truck' }, complaints: [complaint], odometer: '410,000' } });
  return { id, unitId };
}

describe('the list of cases', () => {
  let workshop: Tenant;
  const made: Record<string, { id: string; unitId: string }> = {};
  type Input = Parameters<typeof listCases>[0]['input'];
  const numbers = async (input: Input) => (await listCases({ ctx: workshop.ctx, input })).cases.map(({ fleetNumber }) => fleetNumber);

  beforeAll(async () => {
    workshop = await makeWorkshop(databases);
    for (const number of ['K-10', 'k-2', 'K-1', 'L-3']) made[number] = await openOn(workshop, number, number === 'L-3' ? 'complaint-noise' : undefined);
  });

  it('sorts fleet numbers as people count, here and in the list of units', async () => {
    const sorted = ['K-1', 'k-2', 'K-10', 'L-3'];
    expect(await numbers({ sort: 'unit', direction: 'asc' })).toEqual(sorted);
    expect(await numbers({ sort: 'unit', direction: 'desc' })).toEqual(sorted.toReversed());
    const { units } = await listUnits({ ctx: workshop.ctx, input: { sort: 'number' } });
    expect(units.map(({ fleetNumber }) => fleetNumber)).toEqual(sorted);
  });

  it('says what stands, whose it is and since when', async () => {
    const { cases } = await listCases({ ctx: workshop.ctx, input: { q: 'K-10' } });
    expect(cases).toEqual([
      expect.objectContaining({ fleetNumber: 'K-10', odometerM: expect.closeTo(659_831_040, 0), assignedTo: workshop.ctx.person.name, days: 0, complaints: [expect.any(String)], leader: { name: expect.any(String), p: expect.any(Number) }, holds: [] }),
    ]);
  });

  it('filters by complaint and by whose, and sorts by what moved last', async () => {
    expect(await numbers({ complaint: 'complaint-noise' })).toEqual(['L-3']);
    expect(await numbers({ complaint: 'nonsense; drop' })).toHaveLength(4);
    await assignCase({ ctx: workshop.ctx, input: { caseId: made['k-2']?.id ?? '', personId: null } });
    expect(await numbers({ whose: 'nobody' })).toEqual(['k-2']);
    expect(await numbers({ whose: workshop.ctx.person.id })).toHaveLength(3);
    expect((await numbers({ sort: 'active', direction: 'desc' }))[0]).toBe('k-2');
  });

  it('marks every case of a unit that is not to be released, until the check has passed', async () => {
    const { id: caseId = '', unitId = '' } = made['K-1'] ?? {};
    const { ctx } = workshop;
    const second = newId();
    await openCase({ ctx, input: { id: second, unit: { kind: 'known', unitId }, complaints: ['complaint-noise'] } });
    expect(await numbers({ held: 'yes' })).toEqual([]);

    const held = await give(ctx, { caseId, checkId: 'oil-in-service-tanks', answer: yes });
    expect(held.releaseHolds).toEqual(['oil-in-service-tanks']);
    expect(await numbers({ held: 'yes' })).toEqual(['K-1', 'K-1']);
    const { cases } = await listCases({ ctx, input: { q: 'K-1', sort: 'number', direction: 'asc' } });
    expect(cases.filter(({ fleetNumber }) => fleetNumber === 'K-1').map(({ holds }) => holds)).toEqual([['Oil in the service tanks'], ['Oil in the service tanks']]);
    expect((await readUnit({ ctx, input: { unitId } })).holds).toMatchObject([{ caseId, check: 'Oil in the service tanks', passedAt: null }]);
    const other = await readCase({ ctx, input: { caseId: second } });
    expect(other.state.releaseHolds).toEqual([]);
    expect(other.otherHolds).toEqual([{ caseId, number: expect.any(Number), checks: ['Oil in the service tanks'], passed: [] }]);

    await give(ctx, { caseId, checkId: 'oil-in-service-tanks', answer: { kind: 'cannot-tell' } });
    expect(await numbers({ held: 'yes' })).toHaveLength(2);
    const passed = await give(ctx, { caseId, checkId: 'oil-in-service-tanks', answer: no });
    expect(passed.releaseHolds).toEqual([]);
    // It has passed, and stays until somebody with the right lifts it.
    expect(await numbers({ held: 'yes' })).toHaveLength(2);
    const [hold] = (await readUnit({ ctx, input: { unitId } })).holds;
    await liftHold({ ctx: { ...ctx, mayRelease: true }, input: { unitId, holdId: hold?.id ?? '', found: 'Dry after a week' } });
    expect(await numbers({ held: 'yes' })).toEqual([]);
  });
});

describe('saved views', () => {
  it('are named, used, renamed and deleted by the one who saved them, and seen by nobody else', async () => {
    const { ctx } = await makeWorkshop(databases);
    const stranger = await makeWorkshop(databases);
    const id = newId();
    const all = async (who = ctx) => (await listSavedViews({ ctx: who, input: { list: 'cases' } })).map(({ name, query }) => ({ name, query }));
    await saveView({ ctx, input: { id, list: 'cases', name: 'Mine', query: 'whose=me&page=4&nonsense=1&status=no-such' } });
    const query = filtersOf('whose=me');
    expect(await all()).toEqual([{ name: 'Mine', query }]);
    expect(await all(stranger.ctx)).toEqual([]);

    await saveView({ ctx, input: { id, list: 'cases', name: 'Mine', query: 'whose=me' } });
    expect(await all()).toHaveLength(1);
    await expect(saveView({ ctx, input: { id: newId(), list: 'cases', name: 'Mine', query: '' } })).rejects.toMatchObject({ fields: { name: expect.any(String) } });
    await expect(renameView({ ctx: stranger.ctx, input: { id, name: 'Theirs' } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(removeView({ ctx: stranger.ctx, input: { id } })).rejects.toMatchObject({ code: 'not-found' });

    await renameView({ ctx, input: { id, name: 'With me' } });
    expect(await all()).toEqual([{ name: 'With me', query }]);
    await removeView({ ctx, input: { id } });
    expect(await all()).toEqual([]);
  });
});
