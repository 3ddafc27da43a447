import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { audit, unit } from '@/db/schema';
import { newId } from '@/lib/ids';
import { changeUnit } from '@/lib/services/unit/change';
import { createUnit } from '@/lib/services/unit/create';
import { hideUnit, showUnit } from '@/lib/services/unit/hide';
import { listUnits } from '@/lib/services/unit/list';
import { readUnit, readUnitForm } from '@/lib/services/unit/read';
import { browseUnits } from '@/lib/services/unit/browse';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant } from '@/tests/support/tenant';
import { sent, unitForm } from './form';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

const CUBIC_INCH_M3 = 0.0254 ** 3;

describe('adding a unit', () => {
  test('keeps what was typed, SI beside it, the first reading, and an audit row', async () => {
    const { ctx, siteId, asOwner } = await makeTenant(databases);
    const form = unitForm(siteId, { vocation: 'stop-start', reservoirs: '4,500', builtOn: '2019-05-02', odometer: '410,000', engineHours: '9,120 h', readOn: '2025-11-03' });
    await createUnit({ ctx, input: form });

    const { unit: row, readings } = await readUnit({ ctx, input: { unitId: form.id } });
    expect(row).toMatchObject({ fleetNumber: form.fleetNumber, vocation: 'stop-start', country: 'US', asTyped: { reservoirM3: '4,500 in³' } });
    expect(row.reservoirM3).toBeCloseTo(4500 * CUBIC_INCH_M3, 12);
    expect(readings).toHaveLength(1);
    expect(readings[0]).toMatchObject({ readOn: '2025-11-03', source: 'unit', asTyped: { odometerM: '410,000 mi', engineS: '9,120 h' } });
    expect(readings[0]?.odometerM).toBeCloseTo(410_000 * 1609.344, 3);
    expect(readings[0]?.engineS).toBe(9120 * 3600);

    const rows = await asOwner((tx) => tx.select().from(audit).where(eq(audit.entityId, form.id)));
    expect(rows.map((entry) => entry.action)).toEqual(['create.unit']);
  });

  test('takes bare figures in the units of the person: kilometres and litres outside the United States', async () => {
    const { ctx, siteId } = await makeTenant(databases, { country: 'DE', timeZone: 'Europe/Berlin' });
    const form = unitForm(siteId, { reservoirs: '74', odometer: '410000' });
    await createUnit({ ctx, input: form });
    const { unit: row, readings } = await readUnit({ ctx, input: { unitId: form.id } });
    expect(row.reservoirM3).toBeCloseTo(0.074, 12);
    expect(readings[0]?.odometerM).toBe(410_000_000);
  });

  test('sent twice, adds one, with one reading', async () => {
    const { ctx, siteId } = await makeTenant(databases);
    const form = unitForm(siteId, { odometer: '1000' });
    await createUnit({ ctx, input: form });
    await createUnit({ ctx, input: form });
    expect((await readUnit({ ctx, input: { unitId: form.id } })).readings).toHaveLength(1);
  });

  test('refuses a number that another unit has, however it is capitalised', async () => {
    const { ctx, siteId } = await makeTenant(databases);
    await createUnit({ ctx, input: unitForm(siteId, { fleetNumber: 'K-104' }) });
    await expect(createUnit({ ctx, input: unitForm(siteId, { fleetNumber: 'k-104' }) })).rejects.toMatchObject({
      code: 'conflict',
      fields: { fleetNumber: 'There is a unit K-104 already.' },
    });
  });

  test('two of the same number at the same time: one is added, the other refused', async () => {
    const { ctx, siteId } = await makeTenant(databases);
    const both = await Promise.allSettled([1, 2].map(() => createUnit({ ctx, input: unitForm(siteId, { fleetNumber: 'K-7' }) })));
    expect(both.map(({ status }) => status).toSorted()).toEqual(['fulfilled', 'rejected']);
    expect(both.find((one) => one.status === 'rejected')?.reason).toMatchObject({ code: 'conflict' });
  });

  test('refuses a site of another organisation, and names every field that is wrong', async () => {
    const { ctx, siteId } = await makeTenant(databases);
    const other = await makeTenant(databases);
    await expect(createUnit({ ctx, input: unitForm(other.siteId) })).rejects.toMatchObject({ code: 'invalid', fields: { siteId: expect.any(String) } });
    await expect(createUnit({ ctx, input: unitForm(siteId, { reservoirs: 'plenty', requiredReservoirs: '12 psi' }) })).rejects.toMatchObject({
      code: 'invalid',
      fields: { reservoirs: expect.any(String), requiredReservoirs: expect.any(String) },
    });
    await expect(createUnit({ ctx, input: { ...unitForm(siteId), fleetNumber: ' ', builtOn: '2019-02-30', vehicleKind: 'boat' as 'bus' } })).rejects.toMatchObject({
      code: 'invalid',
      fields: { fleetNumber: 'Enter the fleet number.', builtOn: expect.any(String), vehicleKind: 'Choose truck or bus.' },
    });
  });

  test('refuses a reading of tomorrow, by the day of the site', async () => {
    const now = () => new Date('2025-06-02T03:00:00Z');
    const { ctx, siteId } = await makeTenant(databases, { timeZone: 'America/Chicago', now });
    const form = unitForm(siteId, { odometer: '1000', readOn: '2025-06-02' });
    await expect(createUnit({ ctx, input: form })).rejects.toMatchObject({ fields: { readOn: 'This day is yet to come.' } });
    await createUnit({ ctx, input: { ...form, readOn: '2025-06-01' } });
  });

  test('trainers and administrators read units and do not add them', async () => {
    const { siteId, addPerson } = await makeTenant(databases);
    for (const role of ['trainer', 'administrator'] as const) {
      const ctx = await addPerson({ roles: [role] });
      await expect(createUnit({ ctx, input: unitForm(siteId) })).rejects.toMatchObject({ code: 'forbidden' });
      expect((await listUnits({ ctx, input: {} })).total).toBe(0);
    }
  });
});

describe('changing a unit', () => {
  const opened = async () => {
    const tenant = await makeTenant(databases, { roles: ['manager'] });
    const form = unitForm(tenant.siteId, { reservoirs: '1.375 ft3' });
    await createUnit({ ctx: tenant.ctx, input: form });
    const { version, values } = await readUnitForm({ ctx: tenant.ctx, input: { unitId: form.id } });
    return { ...tenant, unitId: form.id, input: sent(changeUnit, { ...values, unitId: form.id, version }) };
  };

  test('a form saved as it was opened changes nothing, not even the last digit of a measure', async () => {
    const { ctx, unitId, input } = await opened();
    const before = (await readUnit({ ctx, input: { unitId } })).unit;
    await changeUnit({ ctx, input });
    expect((await readUnit({ ctx, input: { unitId } })).unit).toEqual(before);
  });

  test('writes only what changed into the audit', async () => {
    const { ctx, unitId, input, asOwner } = await opened();
    await changeUnit({ ctx, input: { ...input, engineFamily: 'Brennor 12' } });
    const rows = await asOwner((tx) => tx.select().from(audit).where(eq(audit.action, 'change.unit')));
    expect(rows.find((row) => row.entityId === unitId)?.changed).toEqual({ engineFamily: 'Brennor 12' });
  });

  test('is refused when somebody saved meanwhile, with what is stored beside what differs', async () => {
    const { ctx, unitId, input } = await opened();
    await changeUnit({ ctx, input: { ...input, vocation: 'regional' } });
    const late = { ...input, vocation: 'long-haul' as const };
    await expect(changeUnit({ ctx, input: late })).rejects.toMatchObject({ code: 'stale', fields: { vocation: 'Stored now: Regional' } });
    const { version } = await readUnitForm({ ctx, input: { unitId } });
    await changeUnit({ ctx, input: { ...late, version } });
    expect((await readUnit({ ctx, input: { unitId } })).unit.vocation).toBe('long-haul');
  });

  test("another organisation's unit is not found, to read, change or hide", async () => {
    const { unitId, input } = await opened();
    const { ctx } = await makeTenant(databases, { roles: ['manager'] });
    await expect(readUnit({ ctx, input: { unitId } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(changeUnit({ ctx, input })).rejects.toMatchObject({ code: 'not-found' });
    await expect(hideUnit({ ctx, input: { unitId, reason: 'Sold' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('hiding a unit', () => {
  test('takes it out of list and search, tells who and why, and can be undone', async () => {
    const { ctx, siteId } = await makeTenant(databases);
    const form = unitForm(siteId, { fleetNumber: 'K-9' });
    await createUnit({ ctx, input: form });
    await hideUnit({ ctx, input: { unitId: form.id, reason: 'Sold' } });
    expect((await listUnits({ ctx, input: {} })).total).toBe(0);
    expect((await browseUnits({ ctx, input: { q: 'K' } })).units).toEqual([]);
    expect((await listUnits({ ctx, input: { hidden: 'yes' } })).units.map((row) => row.fleetNumber)).toEqual(['K-9']);
    expect((await readUnit({ ctx, input: { unitId: form.id } })).hidden).toMatchObject({ kind: 'hide', reason: 'Sold', by: ctx.person.name });
    await expect(createUnit({ ctx, input: unitForm(siteId, { fleetNumber: 'K-9' }) })).rejects.toMatchObject({ fields: { fleetNumber: expect.stringContaining('hidden') } });

    await showUnit({ ctx, input: { unitId: form.id } });
    expect((await listUnits({ ctx, input: {} })).total).toBe(1);
  });

  test('needs a reason', async () => {
    const { ctx } = await makeTenant(databases);
    await expect(hideUnit({ ctx, input: { unitId: newId(), reason: ' ' } })).rejects.toMatchObject({ fields: { reason: 'Say why.' } });
  });
});

describe('lists', () => {
  test('filter, sort and page; nonsense in the address is as if it were not there', async () => {
    const { ctx, siteId, organisationId, asOwner } = await makeTenant(databases);
    await asOwner((tx) =>
      tx.insert(unit).values(
        Array.from({ length: 60 }, (_, index) => ({
          organisationId,
          id: newId(),
          siteId,
          fleetNumber: `B-${String(index).padStart(3, '0')}`,
          vehicleKind: index % 3 === 0 ? 'bus' : 'truck',
          vocation: index % 2 === 0 ? 'regional' : null,
          country: 'US',
        })),
      ),
    );
    const first = await listUnits({ ctx, input: { sort: 'number', direction: 'desc' } });
    expect(first).toMatchObject({ total: 60, pages: 2 });
    expect(first.units).toHaveLength(50);
    expect(first.units[0]?.fleetNumber).toBe('B-059');
    expect((await listUnits({ ctx, input: { page: 2 } })).units).toHaveLength(10);
    expect((await listUnits({ ctx, input: { kind: 'bus', vocation: 'regional' } })).total).toBe(10);
    expect((await listUnits({ ctx, input: { q: '-01' } })).total).toBe(10);
    expect((await listUnits({ ctx, input: { q: '%' } })).total).toBe(0);
    expect((await listUnits({ ctx, input: { sort: 'drop table' as 'number', page: 'x', kind: 'boat' as 'bus' } })).query).toMatchObject({ sort: 'number', page: 1 });
  });

  test('search puts the exact number first, then those that begin with the text', async () => {
    const { ctx, siteId } = await makeTenant(databases);
    for (const fleetNumber of ['A-12', '12-B', '12', '112']) await createUnit({ ctx, input: unitForm(siteId, { fleetNumber }) });
    const { units } = await browseUnits({ ctx, input: { q: '12' } });
    expect(units.map((row) => row.fleetNumber)).toEqual(['12', '12-B', '112', 'A-12']);
  });
});
