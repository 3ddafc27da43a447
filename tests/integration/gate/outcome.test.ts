import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { readGateOutcome } from '@/lib/services/gate/outcome';
import { makeWorkshop } from '@/tests/integration/cases/support';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { makeAGate, makeAUnit } from './support';

const NOW = new Date('2026-12-01T12:00:00Z');
let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

interface Given {
  /** YYYY-MM-DD */
  fittedOn: string;
  passedOn?: string;
  verdict?: 'fit' | 'not-yet';
  caseOn?: string;
  paid?: number;
}

/** A unit with a fit, perhaps a passage before it, a case after it, and a claim that was paid. */
async function fitted(tenant: Tenant, gateId: string, { fittedOn, passedOn, verdict = 'fit', caseOn, paid }: Given) {
  const { organisationId, siteId, editionId, personId } = tenant;
  const { unitId } = await makeAUnit(tenant);
  const [modelId, fitId, caseId] = [newId(), newId(), newId()];
  await tenant.asOwner(async (tx) => {
    await tx.execute(sql`insert into compressor_model (organisation_id, id, name) values (${organisationId}, ${modelId}, ${modelId})`);
    await tx.execute(sql`insert into fit (organisation_id, id, unit_id, model_id, condition, installed_on) values (${organisationId}, ${fitId}, ${unitId}, ${modelId}, 'new', ${fittedOn})`);
    if (passedOn) {
      const at = `${passedOn}T15:00:00Z`;
      await tx.execute(sql`insert into gate_passage (organisation_id, id, gate_id, site_id, unit_id, edition_id, complaints, by_name, started_at, ended_at, verdict)
        values (${organisationId}, ${newId()}, ${gateId}, ${siteId}, ${unitId}, ${editionId}, '{}', 'Kim', ${at}, ${at}, ${verdict})`);
    }
    if (caseOn) {
      await tx.execute(sql`insert into "case" (organisation_id, id, number, unit_id, site_id, fit_id, edition_id, complaints, opened_by, opened_at)
        values (${organisationId}, ${caseId}, ${Math.floor(Math.random() * 1e9)}, ${unitId}, ${siteId}, ${fitId}, ${editionId}, '{complaint-oil}', ${personId}, ${`${caseOn}T15:00:00Z`})`);
      if (paid) await tx.execute(sql`insert into claim (organisation_id, id, case_id, to_whom, sent_on, state, settled_amount, created_by) values (${organisationId}, ${newId()}, ${caseId}, 'Desk', ${caseOn}, 'paid', ${paid}, ${personId})`);
    }
  });
}

async function withGate() {
  const tenant = await makeWorkshop(databases, { now: () => new Date('2026-01-02T12:00:00Z'), roles: ['manager'] });
  const { gateId } = await makeAGate(tenant);
  const read = () => readGateOutcome({ ctx: { ...tenant.ctx, now: () => NOW }, input: {} });
  return { tenant, gateId, read };
}

describe('the outcome of the gate', () => {
  it('ties a fit to the last passage of its unit in the thirty days before it', async () => {
    const { tenant, gateId, read } = await withGate();
    await fitted(tenant, gateId, { fittedOn: '2026-03-31', passedOn: '2026-03-01', verdict: 'not-yet' });
    await fitted(tenant, gateId, { fittedOn: '2026-03-31', passedOn: '2026-02-27' });
    await fitted(tenant, gateId, { fittedOn: '2026-03-31', passedOn: '2026-03-31' });
    await fitted(tenant, gateId, { fittedOn: '2026-03-31', passedOn: '2026-04-01' });
    expect(await read()).toMatchObject({ gated: { of: 2 }, saidFit: { of: 1 }, saidNotYet: { of: 1 }, ungated: { of: 2 } });
  });

  it('counts what came back within ninety days of fits that could be followed, and shows few as a count', async () => {
    const { tenant, gateId, read } = await withGate();
    await fitted(tenant, gateId, { fittedOn: '2026-03-01', passedOn: '2026-02-25', caseOn: '2026-05-30', paid: 400 });
    await fitted(tenant, gateId, { fittedOn: '2026-03-01', passedOn: '2026-02-25', caseOn: '2026-05-31' });
    await fitted(tenant, gateId, { fittedOn: '2026-03-01', passedOn: '2026-02-25', caseOn: '2026-03-01' });
    // Too recent, though it came back; and before there was a gate.
    await fitted(tenant, gateId, { fittedOn: '2026-11-01', passedOn: '2026-10-25', caseOn: '2026-11-10' });
    await fitted(tenant, gateId, { fittedOn: '2026-01-01', caseOn: '2026-01-20' });
    expect(await read()).toMatchObject({
      gated: { of: 3, cameBack: 1, tooRecent: 1, claimPaid: 1, paidAmount: 400, comebacks: { kind: 'count-alone', count: 1, of: 3 } },
      ungated: { of: 0, comebacks: { kind: 'nothing-counted' } },
      comebackDifference: null,
    });
  });

  it('compares from five on each side, with Newcombe’s interval, and sees no other organisation', async () => {
    const { tenant, gateId, read } = await withGate();
    const other = await withGate();
    for (let i = 0; i < 10; i++) await fitted(tenant, gateId, { fittedOn: '2026-03-01', passedOn: '2026-02-25', caseOn: i < 5 ? '2026-04-01' : undefined });
    for (let i = 0; i < 8; i++) await fitted(tenant, gateId, { fittedOn: '2026-03-01', caseOn: i < 6 ? '2026-04-01' : undefined });
    const { comebackDifference, gated } = await read();
    expect(gated.comebacks).toMatchObject({ kind: 'estimated', share: 0.5 });
    // Worked by hand from Wilson's limits (0.2366, 0.7634) of 5 in 10 and (0.4093, 0.9285) of 6 in 8.
    expect(comebackDifference?.difference).toBeCloseTo(-0.25, 12);
    expect(comebackDifference?.limits.lower).toBeCloseTo(-0.25 - Math.hypot(0.5 - 0.2366, 0.9285 - 0.75), 3);
    expect(comebackDifference?.limits.upper).toBeCloseTo(-0.25 + Math.hypot(0.7634 - 0.5, 0.75 - 0.4093), 3);
    expect(await other.read()).toMatchObject({ gated: { of: 0 }, ungated: { of: 0 } });
  });
});
