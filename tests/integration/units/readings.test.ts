import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { addReading } from '@/lib/services/unit/add-reading';
import { createUnit } from '@/lib/services/unit/create';
import { listUnits } from '@/lib/services/unit/list';
import { readUnit } from '@/lib/services/unit/read';
import { strikeReading } from '@/lib/services/unit/strike-reading';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant } from '@/tests/support/tenant';
import { unitForm } from './form';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

async function unitWithReadings() {
  const tenant = await makeTenant(databases);
  const form = unitForm(tenant.siteId);
  await createUnit({ ctx: tenant.ctx, input: form });
  const add = (readOn: string, odometer: string, more: object = {}) => addReading({ ctx: tenant.ctx, input: { unitId: form.id, readOn, odometer, ...more } });
  await add('2025-01-10', '100,000');
  await add('2025-03-10', '110,000');
  const read = async () => (await readUnit({ ctx: tenant.ctx, input: { unitId: form.id } })).readings;
  return { ...tenant, unitId: form.id, add, read };
}

describe('an odometer never runs backwards silently', () => {
  test('lower than an earlier reading is refused, with that reading named', async () => {
    const { add, read } = await unitWithReadings();
    await expect(add('2025-04-01', '109,000')).rejects.toMatchObject({
      code: 'invalid',
      fields: { odometer: expect.stringMatching(/110,000\smi on 10 Mar 2025.*replaced/) },
    });
    expect(await read()).toHaveLength(2);
  });

  test('higher than a later reading is refused', async () => {
    const { add } = await unitWithReadings();
    await expect(add('2025-02-01', '111,000')).rejects.toMatchObject({ fields: { odometer: expect.stringContaining('10 Mar 2025') } });
  });

  test('between its neighbours it is taken, however late it is written down', async () => {
    const { add, read } = await unitWithReadings();
    await add('2025-02-01', '105,000');
    expect((await read()).map((row) => row.readOn)).toEqual(['2025-01-10', '2025-02-01', '2025-03-10']);
  });

  test('on the same day it may not be lower than what that day has', async () => {
    const { add } = await unitWithReadings();
    await expect(add('2025-03-10', '109,999')).rejects.toMatchObject({ code: 'invalid' });
    await add('2025-03-10', '110,000');
  });

  test('a replaced one may start anew, and the ones after it are compared with it', async () => {
    const { add, read } = await unitWithReadings();
    await add('2025-04-01', '12', { odometerReplaced: 'on' });
    await add('2025-05-01', '4,000');
    await expect(add('2025-06-01', '3,000')).rejects.toMatchObject({ code: 'invalid' });
    expect((await read()).map((row) => row.odometerReplaced)).toEqual([false, false, true, false]);
  });

  test('engine hours are held to the same, each instrument by itself', async () => {
    const { add, read } = await unitWithReadings();
    await add('2025-04-01', '111,000', { engineHours: '5,000' });
    await expect(add('2025-05-01', '112,000', { engineHours: '4,000' })).rejects.toMatchObject({ fields: { engineHours: expect.stringContaining('hour meter') } });
    await add('2025-05-01', '112,000', { engineHours: '3', engineHoursReplaced: true });
    expect((await read()).at(-1)).toMatchObject({ odometerReplaced: false, engineHoursReplaced: true });
  });

  test('two readings written at the same time cannot contradict each other', async () => {
    const { add, read } = await unitWithReadings();
    const both = await Promise.allSettled([add('2025-04-02', '120,000'), add('2025-04-03', '115,000')]);
    expect(both.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect(await read()).toHaveLength(3);
  });
});

describe('a wrong reading', () => {
  test('is struck out with a reason, and no longer counts', async () => {
    const { ctx, add, read, unitId } = await unitWithReadings();
    await add('2025-04-01', '1,200,000');
    await expect(add('2025-05-01', '121,000')).rejects.toMatchObject({ code: 'invalid' });
    const wrong = (await read()).at(-1);
    await strikeReading({ ctx, input: { unitId, readingId: wrong?.id ?? '', whyWrong: 'A nought too many' } });
    await add('2025-05-01', '121,000');
    expect((await read()).map((row) => row.readOn)).toEqual(['2025-01-10', '2025-03-10', '2025-05-01']);
    expect((await listUnits({ ctx, input: {} })).units[0]?.readOn).toBe('2025-05-01');
  });

  test('of another unit is not found', async () => {
    const one = await unitWithReadings();
    const [reading] = await one.read();
    const other = await unitWithReadings();
    await expect(strikeReading({ ctx: other.ctx, input: { unitId: other.unitId, readingId: reading?.id ?? '', whyWrong: 'x' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('what is refused', () => {
  test('a reading with neither figure, of the future, and of a unit elsewhere', async () => {
    const { ctx, unitId } = await unitWithReadings();
    await expect(addReading({ ctx, input: { unitId, readOn: '2025-04-01' } })).rejects.toMatchObject({ fields: { odometer: expect.any(String) } });
    await expect(addReading({ ctx, input: { unitId, readOn: '2999-04-01', odometer: '1' } })).rejects.toMatchObject({ fields: { readOn: 'This day is yet to come.' } });
    const other = await makeTenant(databases);
    await expect(addReading({ ctx: other.ctx, input: { unitId, readOn: '2025-04-01', odometer: '1' } })).rejects.toMatchObject({ code: 'not-found' });
  });

  test('a figure that could be read in two ways, where nothing settles it', async () => {
    const { ctx, siteId } = await makeTenant(databases, { country: 'DE', timeZone: 'Europe/Berlin' });
    const form = unitForm(siteId, { odometer: '410.000' });
    await expect(createUnit({ ctx, input: form })).rejects.toMatchObject({ fields: { odometer: expect.stringContaining('410000') } });
  });
});
