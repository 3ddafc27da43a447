import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { buildReasons } from '@/lib/case/build-reasons';
import { buildState } from '@/lib/case/build-state';
import { provisionalParts } from '@/lib/case/provisional';
import { compileTrusted } from '@/lib/diagnose/compile';
import { newId } from '@/lib/ids';
import type { AnswerInput } from '@/lib/schemas/case';
import type { Waiting } from '@/lib/schemas/waiting';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { readCaseKit } from '@/lib/services/case/kit';
import { readCaseReasons, readCaseState } from '@/lib/services/case/read';
import { recordFinding } from '@/lib/services/case/record-finding';
import { readEdition } from '@/lib/services/edition/read';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { formatQuantity, isUnitOf } from '@/lib/units';
import { seededRandom } from '@/tests/support/random';
import type { Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, openACase } from './support';

let databases: TestDatabases;
let tenant: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  tenant = await makeWorkshop(databases);
});
afterAll(() => databases.close());

/** A device: what it was given of a case, as JSON brings it, and what is done on it afterwards. */
async function deviceOf({ ctx }: Tenant, caseId: string) {
  const kit = JSON.parse(JSON.stringify(await readCaseKit({ ctx, input: { caseId } }))) as Awaited<ReturnType<typeof readCaseKit>>;
  const edition = JSON.parse(JSON.stringify(await readEdition({ ctx, input: { editionId: kit.editionId } }))) as Awaited<ReturnType<typeof readEdition>>;
  const compiled = compileTrusted(edition.rulebook);
  const waiting: Waiting[] = [];
  const common = { personId: kit.personId, organisationId: kit.organisationId, caseId, refusal: null };
  return {
    compiled,
    waiting,
    answer(checkId: string, answer: AnswerInput, at: Date) {
      const id = newId();
      const cautions = compiled.checks.get(checkId)?.check.cautions ?? [];
      const when = { deviceAt: at.toISOString(), clockOffsetMs: 0 };
      if (cautions.length > 0) {
        waiting.push({ ...common, kind: 'acknowledgement', id: newId(), body: { checkId, cautions: cautions.map((cautionId) => ({ id: newId(), cautionId })), ...when } });
      }
      waiting.push({ ...common, kind: 'finding', id, body: { id, checkId, answer, ...when } });
    },
    parts: (now: Date) => provisionalParts({ compiled, kit, waiting, now }),
    /** Sends everything, as the sender does. */
    async send() {
      for (const item of waiting) {
        if (item.kind === 'finding') await recordFinding({ ctx, input: { ...item.body, caseId } });
        if (item.kind === 'acknowledgement') await acknowledgeCautions({ ctx, input: { ...item.body, caseId } });
      }
    },
  };
}

describe('a case on a device without a connection', () => {
  test('stands, is ranked and explained as on the server for the same findings, to 1e-12', async () => {
    const random = seededRandom(2_604);
    for (let round = 0; round < 4; round += 1) {
      const caseId = await openACase(tenant);
      await give(tenant.ctx, { caseId, checkId: 'onset', answer: { kind: 'cannot-tell' } });
      const device = await deviceOf(tenant, caseId);
      const checks = [...device.compiled.checks.values()].filter(({ check }) => !check.id.startsWith('complaint'));
      const start = Date.now() - 60_000;
      for (let i = 0; i < 14; i += 1) {
        const { check } = random.pick(checks);
        const at = new Date(start + i * 1_000);
        const sureness = random.chance(0.3) ? 'think-so' : 'sure';
        if (check.kind === 'measured') {
          if (!check.quantity || !check.unit || !check.range || !isUnitOf(check.quantity, check.unit)) continue;
          const value = formatQuantity(random.between(check.range.min, check.range.max), { quantity: check.quantity, unit: check.unit });
          device.answer(check.id, { kind: 'measured', value, sureness }, at);
        } else {
          device.answer(check.id, random.chance(0.1) ? { kind: 'cannot-tell' } : { kind: 'state', state: random.pick(check.states).id, sureness }, at);
        }
      }
      const here = buildState(device.parts(new Date()));
      const reasonsHere = buildReasons(device.parts(new Date()));
      await device.send();
      const there = await readCaseState({ ctx: tenant.ctx, input: { caseId } });
      const reasonsThere = await readCaseReasons({ ctx: tenant.ctx, input: { caseId } });

      expect(here.causes.map(({ causeId }) => causeId)).toEqual(there.causes.map(({ causeId }) => causeId));
      here.causes.forEach(({ p, change }, i) => {
        expect(Math.abs(p - (there.causes[i]?.p ?? NaN))).toBeLessThan(1e-12);
        expect(Math.abs((change ?? 0) - (there.causes[i]?.change ?? NaN))).toBeLessThan(1e-12);
      });
      expect(here.next).toEqual(there.next);
      expect(here.repairs).toEqual(there.repairs);
      expect(here.suspicion).toEqual(there.suspicion);
      expect(here.because).toEqual(there.because);
      expect(here.vehicleState).toEqual(there.vehicleState);
      expect(here.findings.filter(({ current }) => current).map(({ id }) => id).sort()).toEqual(there.findings.filter(({ current }) => current).map(({ id }) => id).sort());
      expect(reasonsHere.causes).toEqual(reasonsThere.causes);
      expect(reasonsHere.settle).toEqual(reasonsThere.settle);
    }
  }, 120_000);

  test('counts cautions for the day on which they were read', async () => {
    const caseId = await openACase(tenant);
    const device = await deviceOf(tenant, caseId);
    const careful = [...device.compiled.checks.values()].find(({ check }) => check.cautions.length > 0 && check.kind !== 'measured')?.check;
    if (!careful) throw new Error('no check with a caution');
    const lastNight = new Date(Date.now() - 26 * 3_600_000);
    device.answer(careful.id, { kind: 'cannot-tell' }, lastNight);
    device.answer(careful.id, { kind: 'state', state: careful.states[0]?.id ?? '', sureness: 'sure' }, new Date(lastNight.getTime() + 1_000));
    expect(buildState(device.parts(new Date())).acknowledged).toEqual([]);
    await device.send();
    const state = await readCaseState({ ctx: tenant.ctx, input: { caseId } });
    expect(state.findings.find(({ checkId }) => checkId === careful.id)).toMatchObject({ current: true, kind: 'state' });
    expect(state.acknowledged).toEqual([]);
  });

  test('takes nothing twice when everything is sent again', async () => {
    const caseId = await openACase(tenant);
    const device = await deviceOf(tenant, caseId);
    device.answer('onset', { kind: 'cannot-tell' }, new Date(Date.now() - 2_000));
    device.answer('onset', { kind: 'skip' }, new Date(Date.now() - 1_000));
    await device.send();
    const once = await readCaseState({ ctx: tenant.ctx, input: { caseId } });
    await device.send();
    const twice = await readCaseState({ ctx: tenant.ctx, input: { caseId } });
    expect(twice).toEqual(once);
  });
});
