import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { asTenant } from '@/db/connect';
import { audit } from '@/db/schema';
import { newId } from '@/lib/ids';
import { createModel } from '@/lib/services/compressor-model/create';
import { hideModel } from '@/lib/services/compressor-model/hide';
import { changeFit, takeOutFit } from '@/lib/services/fit/change';
import { createFit } from '@/lib/services/fit/create';
import { hideFit } from '@/lib/services/fit/hide';
import { readFit } from '@/lib/services/fit/read';
import { addReading } from '@/lib/services/unit/add-reading';
import { createUnit } from '@/lib/services/unit/create';
import { readUnit } from '@/lib/services/unit/read';
import { unitRecord } from '@/lib/services/unit/unit-record';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant } from '@/tests/support/tenant';
import { modelForm, sent, unitForm } from '../units/form';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

const MILE_M = 1609.344;

async function unitToFit() {
  const tenant = await makeTenant(databases, { roles: ['technician', 'engineer'] });
  const unit = unitForm(tenant.siteId, { vocation: 'regional', builtOn: '2020-01-01' });
  const model = modelForm({ drainOpening: 'small-hole', cooling: 'coolant' });
  await createUnit({ ctx: tenant.ctx, input: unit });
  await createModel({ ctx: tenant.ctx, input: model });
  const fitForm = (filled: object = {}) => ({ id: newId(), unitId: unit.id, modelId: model.id, condition: 'new' as const, installedOn: '2024-05-01', ...filled });
  const fit = async (filled: object = {}) => (await createFit({ ctx: tenant.ctx, input: fitForm(filled) })).id;
  const unitNow = () => readUnit({ ctx: tenant.ctx, input: { unitId: unit.id } });
  const fitNow = (fitId: string) => readFit({ ctx: tenant.ctx, input: { unitId: unit.id, fitId } });
  const record = (on: string) => asTenant(databases.app, { organisationId: tenant.organisationId }, (tx) => unitRecord(tx, { organisationId: tenant.organisationId, unitId: unit.id, on }));
  return { ...tenant, unitId: unit.id, modelId: model.id, fitForm, fit, unitNow, fitNow, record };
}

describe('recording a fit', () => {
  test('keeps how it was fitted, its readings with the unit, and what the record then knows', async () => {
    const { fit, unitNow, record, ctx, unitId } = await unitToFit();
    const id = await fit({ installedOdometer: '200,000', installedEngineHours: '6000', sealant: 'heavy-bead', dischargeLine: 'kept', driveGear: 'kept', breakInRun: 'no' });
    await addReading({ ctx, input: { unitId, readOn: '2025-02-01', odometer: '260,000' } });
    const { currentFit, readings } = await unitNow();
    expect(currentFit?.id).toBe(id);
    expect(readings.map(({ source, readOn }) => `${source} ${readOn}`)).toEqual(['fit 2024-05-01', 'unit 2025-02-01']);

    const { fitId, facts } = await record('2025-02-03');
    expect(fitId).toBe(id);
    expect(facts).toMatchObject({
      vocation: 'regional',
      drainOpening: 'small-hole',
      cooling: 'coolant',
      newOrRebuilt: 'new',
      sealantAtGasket: 'heavy-bead',
      dischargeLineChanged: 'no',
      driveGearReused: 'yes',
      breakInRun: 'no',
    });
    expect(facts.milesSinceFit).toBeCloseTo(60_000 * MILE_M, 3);
    expect(facts).not.toHaveProperty('governorChanged');
  });

  test('takes the one before out at the same day and readings when it is said why', async () => {
    const { fit, fitNow, unitNow, asOwner } = await unitToFit();
    const first = await fit({ installedOn: '2023-01-10', installedOdometer: '100,000' });
    await expect(fit({ installedOdometer: '200,000' })).rejects.toMatchObject({ fields: { previousWhyOut: expect.stringContaining('10 Jan 2023') } });
    const second = await fit({ installedOdometer: '200,000', previousWhyOut: 'not-the-cause' });
    const { fit: gone } = await fitNow(first);
    expect(gone).toMatchObject({ removedOn: '2024-05-01', whyOut: 'not-the-cause', asTyped: { removedOdometerM: '200,000 mi' } });
    expect(gone.removedOdometerM).toBeCloseTo(200_000 * MILE_M, 3);
    expect((await unitNow()).currentFit?.id).toBe(second);
    expect((await unitNow()).readings).toHaveLength(2);
    const rows = await asOwner((tx) => tx.select().from(audit).where(eq(audit.entityId, first)));
    expect(rows.map((row) => row.action)).toEqual(['create.fit', 'create.fit']);
  });

  test('two compressors are never on one unit at once', async () => {
    const { fit } = await unitToFit();
    await fit({ installedOn: '2023-01-10', removedOn: '2024-05-01', whyOut: 'precaution' });
    await expect(fit({ installedOn: '2024-04-30' })).rejects.toMatchObject({ fields: { installedOn: expect.stringContaining('from 10 Jan 2023 to 1 May 2024') } });
    await fit({ installedOn: '2024-05-01' });
    await expect(fit({ installedOn: '2022-01-01', removedOn: '2023-01-11', whyOut: 'unknown' })).rejects.toMatchObject({ fields: { removedOn: expect.any(String) } });
    await fit({ installedOn: '2022-01-01', removedOn: '2023-01-10', whyOut: 'unknown' });
  });

  test('two recorded at the same time: one is refused', async () => {
    const { fit } = await unitToFit();
    const both = await Promise.allSettled([fit(), fit()]);
    expect(both.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  test('does not come out before it went on, nor half told, nor at fewer miles', async () => {
    const { fit } = await unitToFit();
    await expect(fit({ removedOn: '2024-04-30', whyOut: 'unknown' })).rejects.toMatchObject({ fields: { removedOn: expect.stringContaining('before') } });
    await expect(fit({ removedOn: '2024-06-30' })).rejects.toMatchObject({ fields: { whyOut: 'Say why it came out.' } });
    await expect(fit({ removedOdometer: '5' })).rejects.toMatchObject({ fields: { removedOn: expect.any(String) } });
    const backwards = { installedOdometer: '200,000', removedOn: '2024-06-30', removedOdometer: '199,000', whyOut: 'unknown' };
    await expect(fit(backwards)).rejects.toMatchObject({ fields: { removedOdometer: expect.stringMatching(/200,000/) } });
    await fit({ ...backwards, removedOdometerReplaced: 'on' });
  });

  test('sent twice, records one', async () => {
    const { ctx, fitForm, unitNow } = await unitToFit();
    const input = fitForm({ installedOdometer: '5000' });
    await createFit({ ctx, input });
    await createFit({ ctx, input });
    expect((await unitNow()).fits).toHaveLength(1);
  });

  test("refuses a hidden model, another organisation's model, and another organisation's unit", async () => {
    const { ctx, fit, fitForm, modelId } = await unitToFit();
    const other = await unitToFit();
    await expect(fit({ modelId: other.modelId })).rejects.toMatchObject({ fields: { modelId: expect.any(String) } });
    await expect(fit({ unitId: other.unitId })).rejects.toMatchObject({ code: 'not-found' });
    await hideModel({ ctx, input: { modelId, reason: 'Twice in the list' } });
    await expect(createFit({ ctx, input: fitForm() })).rejects.toMatchObject({ fields: { modelId: expect.any(String) } });
  });

  test('trainers and administrators are refused', async () => {
    const { addPerson, fitForm } = await unitToFit();
    const ctx = await addPerson({ roles: ['trainer', 'administrator'] });
    await expect(createFit({ ctx, input: fitForm() })).rejects.toMatchObject({ code: 'forbidden' });
  });
});

describe('taking a compressor off', () => {
  test('keeps when, at what readings and why; a second time is refused', async () => {
    const { ctx, fit, fitNow, unitNow } = await unitToFit();
    const fitId = await fit({ installedOdometer: '200,000', sealant: 'none' });
    const { version } = await fitNow(fitId);
    const input = { fitId, version, removedOn: '2025-01-05', removedOdometer: '230,000', whyOut: 'failed-seen' as const };
    await expect(takeOutFit({ ctx, input: { ...input, whyOut: '' as 'unknown' } })).rejects.toMatchObject({ fields: { whyOut: 'Say why it came out.' } });
    await takeOutFit({ ctx, input });
    expect((await fitNow(fitId)).fit).toMatchObject({ removedOn: '2025-01-05', whyOut: 'failed-seen', sealant: 'none', asTyped: { installedOdometerM: '200,000 mi', removedOdometerM: '230,000 mi' } });
    expect((await unitNow()).currentFit).toBeNull();
    await expect(takeOutFit({ ctx, input })).rejects.toMatchObject({ code: 'conflict' });
  });
});

describe('correcting a fit', () => {
  test('strikes its old reading out and writes the right one', async () => {
    const { ctx, fit, fitNow, unitNow } = await unitToFit();
    const fitId = await fit({ installedOdometer: '2,000,000' });
    const { version, values } = await fitNow(fitId);
    await changeFit({ ctx, input: sent(changeFit, { ...values, fitId, version, condition: 'rebuilt', installedOdometer: '200,000' }) });
    const { readings, currentFit } = await unitNow();
    expect(readings.map((row) => row.asTyped.odometerM)).toEqual(['200,000 mi']);
    expect(currentFit?.condition).toBe('rebuilt');
  });

  test('leaves readings alone when they did not change', async () => {
    const { ctx, fit, fitNow, unitNow } = await unitToFit();
    const fitId = await fit({ installedOdometer: '200,000' });
    const [before] = (await unitNow()).readings;
    const { version, values } = await fitNow(fitId);
    await changeFit({ ctx, input: sent(changeFit, { ...values, fitId, version, sealant: 'thin-film' }) });
    expect((await unitNow()).readings).toEqual([before]);
  });

  test('can put a compressor back on, unless another followed', async () => {
    const { ctx, fit, fitNow, unitNow } = await unitToFit();
    const fitId = await fit({ removedOn: '2024-09-01', removedOdometer: '210,000', whyOut: 'unknown' });
    const { version, values } = await fitNow(fitId);
    const back = sent(changeFit, { ...values, fitId, version, removedOn: '', removedOdometer: '', whyOut: '' });
    const later = await fit({ installedOn: '2024-10-01' });
    await expect(changeFit({ ctx, input: back })).rejects.toMatchObject({ fields: { removedOn: expect.any(String) } });
    await hideFit({ ctx, input: { fitId: later, reason: 'Wrong unit' } });
    await changeFit({ ctx, input: back });
    expect((await unitNow()).currentFit?.id).toBe(fitId);
    expect((await unitNow()).readings).toEqual([]);
  });

  test('is refused when somebody saved meanwhile', async () => {
    const { ctx, fit, fitNow } = await unitToFit();
    const fitId = await fit();
    const { version, values } = await fitNow(fitId);
    const input = { ...values, fitId, version };
    await changeFit({ ctx, input: sent(changeFit, { ...input, sealant: 'none' }) });
    await expect(changeFit({ ctx, input: sent(changeFit, { ...input, sealant: 'heavy-bead' }) })).rejects.toMatchObject({ code: 'stale', fields: { sealant: 'Stored now: None' } });
  });

  test("another organisation's fit is not found", async () => {
    const { fit, fitNow, unitId } = await unitToFit();
    const fitId = await fit();
    const { version, values } = await fitNow(fitId);
    const { ctx } = await makeTenant(databases);
    await expect(changeFit({ ctx, input: sent(changeFit, { ...values, fitId, version }) })).rejects.toMatchObject({ code: 'not-found' });
    await expect(hideFit({ ctx, input: { fitId, reason: 'x' } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(readFit({ ctx, input: { unitId, fitId } })).rejects.toMatchObject({ code: 'not-found' });
  });
});

test('why the one before came out is refused where none was on the unit', async () => {
  const { fit } = await unitToFit();
  await expect(fit({ previousWhyOut: 'unknown' })).rejects.toMatchObject({ fields: { previousWhyOut: expect.stringContaining('No compressor') } });
});

test('a fit struck out by mistake takes its readings with it', async () => {
  const { ctx, fit, unitNow } = await unitToFit();
  const fitId = await fit({ installedOdometer: '200,000', removedOn: '2024-09-01', removedOdometer: '210,000', whyOut: 'unknown' });
  await hideFit({ ctx, input: { fitId, reason: 'Entered on the wrong unit' } });
  expect(await unitNow()).toMatchObject({ fits: [], readings: [], currentFit: null });
});
