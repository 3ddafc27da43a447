import { afterAll, beforeAll, expect, test } from 'vitest';
import { changeModel } from '@/lib/services/compressor-model/change';
import { createModel } from '@/lib/services/compressor-model/create';
import { hideModel, showModel } from '@/lib/services/compressor-model/hide';
import { listModels } from '@/lib/services/compressor-model/list';
import { readModel, readModelForm } from '@/lib/services/compressor-model/read';
import { createFit } from '@/lib/services/fit/create';
import { createUnit } from '@/lib/services/unit/create';
import { newId } from '@/lib/ids';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant } from '@/tests/support/tenant';
import { modelForm, sent, unitForm } from '../units/form';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

test('a model keeps its measures in SI and as typed', async () => {
  const { ctx } = await makeTenant(databases, { roles: ['engineer'] });
  const form = modelForm({ displacement: '19.4', bore: '3 5/8', stroke: '92 mm', driveRatio: '1.5:1', portBore: '1/2', cylinders: '2', drainOpening: 'small-hole', oilFeedPlace: 'through-drive' });
  await createModel({ ctx, input: form });
  const { model } = await readModel({ ctx, input: { modelId: form.id } });
  expect(model).toMatchObject({
    cylinders: 2,
    driveRatio: 1.5,
    drainOpening: 'small-hole',
    oilFeedPlace: 'through-drive',
    asTyped: { displacementM3: '19.4 in³', boreM: '3 5/8 in', strokeM: '92 mm', driveRatio: '1.5:1', portBoreM: '1/2 in' },
  });
  expect(model.boreM).toBeCloseTo(3.625 * 0.0254, 12);
  expect(model.strokeM).toBeCloseTo(0.092, 12);
  expect(model.displacementM3).toBeCloseTo(19.4 * 0.0254 ** 3, 15);
});

test('a form saved as it was opened changes nothing', async () => {
  const { ctx } = await makeTenant(databases, { roles: ['manager'] });
  const form = modelForm({ bore: '3 5/8', lineSize: '5/8"', cooling: 'air' });
  await createModel({ ctx, input: form });
  const before = (await readModel({ ctx, input: { modelId: form.id } })).model;
  const { values, version } = await readModelForm({ ctx, input: { modelId: form.id } });
  expect(values).toMatchObject({ bore: '3 5/8', lineSize: '5/8"' });
  await changeModel({ ctx, input: sent(changeModel, { ...values, modelId: form.id, version }) });
  expect((await readModel({ ctx, input: { modelId: form.id } })).model).toEqual(before);
});

test('a change is refused when somebody saved meanwhile, and when the name is taken', async () => {
  const { ctx } = await makeTenant(databases, { roles: ['engineer'] });
  const one = modelForm({ name: 'Halden 540' });
  const other = modelForm({ name: 'Brisk 16' });
  await createModel({ ctx, input: one });
  await createModel({ ctx, input: other });
  const { values, version } = await readModelForm({ ctx, input: { modelId: one.id } });
  await expect(changeModel({ ctx, input: sent(changeModel, { ...values, modelId: one.id, version, name: 'brisk 16' }) })).rejects.toMatchObject({ code: 'conflict', fields: { name: 'There is a model Brisk 16 already.' } });
  await changeModel({ ctx, input: sent(changeModel, { ...values, modelId: one.id, version, note: 'Seen with both drains' }) });
  await expect(changeModel({ ctx, input: sent(changeModel, { ...values, modelId: one.id, version, cooling: 'air' }) })).rejects.toMatchObject({
    code: 'stale',
    fields: { note: 'Stored now: Seen with both drains', cooling: 'Stored now: nothing.' },
  });
});

test('technicians, trainers and administrators read models and do not keep them', async () => {
  const { addPerson } = await makeTenant(databases);
  for (const role of ['technician', 'trainer', 'administrator'] as const) {
    const ctx = await addPerson({ roles: [role] });
    await expect(createModel({ ctx, input: modelForm() })).rejects.toMatchObject({ code: 'forbidden' });
    expect((await listModels({ ctx, input: {} })).total).toBe(0);
  }
});

test("another organisation's model is not found, and its name is free", async () => {
  const ours = await makeTenant(databases, { roles: ['engineer'] });
  const theirs = await makeTenant(databases, { roles: ['engineer'] });
  const form = modelForm({ name: 'Halden 540' });
  await createModel({ ctx: theirs.ctx, input: form });
  await expect(readModel({ ctx: ours.ctx, input: { modelId: form.id } })).rejects.toMatchObject({ code: 'not-found' });
  await expect(hideModel({ ctx: ours.ctx, input: { modelId: form.id, reason: 'x' } })).rejects.toMatchObject({ code: 'not-found' });
  await createModel({ ctx: ours.ctx, input: modelForm({ name: 'Halden 540' }) });
});

test('wrong figures are named beside their fields', async () => {
  const { ctx } = await makeTenant(databases, { roles: ['engineer'] });
  await expect(createModel({ ctx, input: modelForm({ bore: 'wide', displacement: '5 bar', name: 'x' }) })).rejects.toMatchObject({
    code: 'invalid',
    fields: { bore: expect.any(String), displacement: expect.any(String) },
  });
  await expect(createModel({ ctx, input: modelForm({ cylinders: '2.5', cooling: 'ice' as 'air' }) })).rejects.toMatchObject({
    code: 'invalid',
    fields: { cylinders: expect.any(String), cooling: expect.any(String) },
  });
});

test('the list counts the units a model is on; hidden ones leave it and come back', async () => {
  const { ctx, siteId } = await makeTenant(databases, { roles: ['engineer'] });
  const model = modelForm({ name: 'Halden 540' });
  const unit = unitForm(siteId);
  await createModel({ ctx, input: model });
  await createModel({ ctx, input: modelForm({ name: 'Brisk 16' }) });
  await createUnit({ ctx, input: unit });
  await createFit({ ctx, input: { id: newId(), unitId: unit.id, modelId: model.id, condition: 'new', installedOn: '2024-01-01' } });
  const { models } = await listModels({ ctx, input: { sort: 'on-units', direction: 'desc' } });
  expect(models.map(({ name, onUnits }) => [name, onUnits])).toEqual([['Halden 540', 1], ['Brisk 16', 0]]);
  expect((await readModel({ ctx, input: { modelId: model.id } })).units.map((row) => row.fleetNumber)).toEqual([unit.fleetNumber]);

  await hideModel({ ctx, input: { modelId: model.id, reason: 'Out of use' } });
  expect((await listModels({ ctx, input: {} })).models.map(({ name }) => name)).toEqual(['Brisk 16']);
  await showModel({ ctx, input: { modelId: model.id } });
  expect((await listModels({ ctx, input: {} })).total).toBe(2);
});
