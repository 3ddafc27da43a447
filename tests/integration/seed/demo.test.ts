import { count, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { asTenant } from '@/db/connect';
import { cases, edition, finding, organisation, run, upstreamEdition } from '@/db/schema';
import { DEMO_TECHNICIAN, ORGANISATION, PEOPLE, SITES } from '@/db/seed/demo/organisation';
import { seedDemo } from '@/db/seed/demo/seed';
import signIns from '@/db/seed/sign-ins.json' with { type: 'json' };
import { compileRulebook } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { jobs } from '@/lib/jobs';
import { noStorage } from '@/lib/storage/none';
import { newId } from '@/lib/ids';
import { callCause } from '@/lib/services/case/call';
import { listCases } from '@/lib/services/case/list';
import { openCase } from '@/lib/services/case/open';
import { readCase } from '@/lib/services/case/read';
import type { Ctx } from '@/lib/services/context';
import { US_UNITS } from '@/lib/units';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';

const TODAY = new Date('2026-03-12T00:00:00Z');
const NOW = new Date('2026-03-12T15:00:00Z');
const of = { organisationId: ORGANISATION.id };

let databases: TestDatabases;
let ctx: Ctx;
beforeAll(async () => {
  databases = await openTestDatabases();
  await databases.owner.transaction((tx) => seedDemo(tx, { today: TODAY, rulebook: defaultRulebook }));
  const { id, name, email } = DEMO_TECHNICIAN;
  ctx = {
    db: databases.app,
    organisation: ORGANISATION,
    person: { id, name, email, units: US_UNITS, siteId: SITES.quillmere.id },
    roles: ['technician'],
    mayRelease: false,
    now: () => NOW,
    jobs,
    signingSecret: 'a secret for tests alone',
    storage: noStorage,
  };
}, 300_000);
afterAll(() => databases.close());

const asDemo: <T>(work: Parameters<typeof asTenant<T>>[2]) => Promise<T> = (work) => asTenant(databases.app, of, work);

/** Every so manieth case of a status. */
async function someCases(status: string, most: number): Promise<string[]> {
  const rows = await asDemo((tx) => tx.select({ id: cases.id }).from(cases).where(eq(cases.status, status)).orderBy(cases.number));
  const step = Math.max(1, Math.floor(rows.length / most));
  return rows.filter((_, i) => i % step === 0).slice(0, most).map(({ id }) => id);
}

describe('the demo in the database', () => {
  test('belongs to an organisation that says it is one, with its next case number right after the last', async () => {
    const [row] = await asDemo((tx) => tx.select().from(organisation));
    const [all] = await asDemo((tx) => tx.select({ count: count() }).from(cases));
    expect(row).toMatchObject({ isDemo: true, nextCaseNumber: (all?.count ?? 0) + 1 });
  });

  test('has those who sign in, one for each role, among its people', () => {
    for (const { email, role } of signIns) expect(PEOPLE.find((one) => one.email === email)?.roles).toEqual([role]);
  });

  test('has the default rulebook as upstream edition 1 and as its own', async () => {
    const [upstream] = await databases.owner.select({ number: upstreamEdition.number }).from(upstreamEdition);
    const [own] = await asDemo((tx) => tx.select({ number: edition.number, upstreamNumber: edition.upstreamNumber }).from(edition));
    expect([upstream, own]).toEqual([{ number: 1 }, { number: 1, upstreamNumber: 1 }]);
  });

  test.each(['open', 'called', 'closed'])('shows %s cases whose last run comes out the same', async (status) => {
    for (const caseId of await someCases(status, 6)) {
      const view = await readCase({ ctx, input: { caseId } });
      expect(view.state).toMatchObject({ status, differs: false });
      expect(view.state.findings.length).toBeGreaterThan(0);
      expect(view.calls.filter(({ standing }) => standing)).toHaveLength(status === 'open' ? 0 : 1);
    }
  }, 120_000);

  test('shows a case as it was at each of its moments', async () => {
    const [caseId = ''] = await someCases('closed', 3);
    const { moments } = await readCase({ ctx, input: { caseId } });
    for (const { at } of moments) expect((await readCase({ ctx, input: { caseId, at } })).state.differs).toBe(false);
  }, 120_000);

  test('has runs as the engine makes them', async () => {
    const compiled = compileRulebook(defaultRulebook);
    const runs = await asDemo((tx) => tx.select({ inputs: run.inputs, result: run.result }).from(run).orderBy(run.id));
    for (const { inputs, result } of runs.filter((_, i) => i % 150 === 0)) {
      const { ranking, agreed } = await runOfRecord(compiled, inputs.findings, { facts: inputs.recordFacts });
      expect(agreed).toBe(true);
      expect(ranking.fired).toEqual(result.fired);
      expect(ranking.fit).toEqual(result.fit);
      expect(ranking.causes.map(({ causeId, p, scoreNats }) => ({ causeId, p, scoreNats }))).toEqual(result.causes);
    }
  }, 120_000);

  test('goes on: a case is called, another opened on a unit of the demo', async () => {
    const [caseId = ''] = await someCases('open', 4);
    const { state } = await readCase({ ctx, input: { caseId } });
    const leader = state.causes[0]?.causeId ?? '';
    await callCause({ ctx, input: { id: newId(), caseId, mainCause: leader, sureness: 'guess', unlistedCause: 'Not known' } });
    const [known] = await asDemo((tx) => tx.select({ unitId: cases.unitId }).from(cases).where(eq(cases.id, caseId)));
    const opened = await openCase({ ctx, input: { id: newId(), unit: { kind: 'known', unitId: known?.unitId ?? '' }, complaints: ['complaint-oil'] } });
    const recorded = await asDemo((tx) => tx.select({ id: finding.id }).from(finding).where(eq(finding.caseId, opened.id)));
    expect(recorded.length).toBeGreaterThan(3);
    const { total } = await listCases({ ctx, input: { status: 'all' } });
    expect(opened.number).toBe(total);
  });
});
