import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { isForTheGate } from '@/lib/gate/next';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { readCase } from '@/lib/services/case/read';
import { revokeGate } from '@/lib/services/gate/links';
import { answerGate, enterGate } from '@/lib/services/gate/pass';
import { viewGatePage } from '@/lib/services/gate/view';
import { makeWorkshop } from '@/tests/integration/cases/support';
import { DAY_MS, makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeVisitor, type Tenant } from '@/tests/support/tenant';
import { makeAGate, makeAUnit, walk, type Answering } from './support';

const clock = makeClock();
let databases: TestDatabases;
let workshop: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases, { now: clock.now });
});
afterAll(() => databases.close());

const visitor = () => makeVisitor(databases, { now: clock.now });
const cannotTell: Answering = () => null;

/** Worn over many miles, with all about it in order. */
const WORN: Readonly<Record<string, { state?: string; value?: string }>> = {
  onset: { state: 'gradually' },
  'miles-since-fit': { value: '400,000 mi' },
  'previous-fits': { value: '0' },
  'intake-filter-state': { state: 'clean' },
  'intake-hose-state': { state: 'sound' },
  'oil-amount': { state: 'light' },
};
const worn: Answering = ({ id }) => WORN[id] ?? null;

/** Says what would be seen were this the cause: of each check the answer that speaks for it most. */
const speaksFor = (causeId: string): Answering => ({ id, states }) => {
  const weights = (state: string) => defaultRulebook.rules.filter(({ conditions }) => JSON.stringify(conditions).includes(`"${id}"`) && JSON.stringify(conditions).includes(`"${state}"`)).reduce((sum, rule) => sum + (rule.weights[causeId] ?? 0), 0);
  if (id === 'miles-since-fit') return { value: '400,000 mi' };
  if (states.length === 0) return null;
  const [best] = [...states].sort((a, b) => weights(b.id) - weights(a.id));
  return best ? { state: best.id } : null;
};

const casesOf = async (tenant: Tenant, unitId: string) => (await tenant.asOwner((tx) => tx.execute<{ id: string; status: string; opened_by: string | null; opened_by_name: string | null; assigned_to: string | null }>(sql`select id, status, opened_by, opened_by_name, assigned_to from "case" where unit_id = ${unitId} order by opened_at`))).rows;

describe('the link of a gate', () => {
  it('leads nowhere once it has run out, was altered, or was revoked', async () => {
    const { token, gateId, asAdministrator } = await makeAGate(workshop, { days: 1 });
    const open = (given: string) => viewGatePage({ visitor: visitor(), input: { token: given } });
    await expect(open(token)).resolves.toMatchObject({ step: 'enter', siteName: 'Yard', askWhom: 'the workshop desk' });
    await expect(open(`${token.slice(0, -2)}${token.endsWith('AA') ? 'BB' : 'AA'}`)).rejects.toMatchObject({ code: 'not-found', message: expect.stringContaining('not one of our links') });
    const [payload = '', signature = ''] = token.split('.');
    const said = JSON.parse(Buffer.from(payload, 'base64url').toString()) as Record<string, unknown>;
    const other = Buffer.from(JSON.stringify({ ...said, siteId: newId() })).toString('base64url');
    await expect(open(`${other}.${signature}`)).rejects.toMatchObject({ code: 'not-found' });
    clock.forward(DAY_MS);
    await expect(open(token)).rejects.toMatchObject({ message: expect.stringContaining('run out') });
    const another = await makeAGate(workshop);
    for (let i = 0; i < 2; i++) await revokeGate({ ctx: another.asAdministrator, input: { siteId: workshop.siteId, gateId: another.gateId } });
    await expect(open(another.token)).rejects.toMatchObject({ message: expect.stringContaining('taken back') });
    await expect(revokeGate({ ctx: asAdministrator, input: { siteId: newId(), gateId } })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('opens the units of its own site alone, and says of any other number the same', async () => {
    const { token } = await makeAGate(workshop);
    const elsewhere = newId();
    await workshop.asOwner((tx) => tx.execute(sql`insert into site (organisation_id, id, name, time_zone) values (${workshop.organisationId}, ${elsewhere}, 'Depot', 'America/Chicago')`));
    const theirs = await makeAUnit({ ...workshop, siteId: elsewhere });
    const enter = (fleetNumber: string) => enterGate({ visitor: visitor(), input: { token, id: newId(), fleetNumber, name: 'Kim', complaints: ['complaint-oil'] } });
    const said = { code: 'invalid', fields: { fleetNumber: 'No unit of Yard bears this number. Ask the workshop desk.' } };
    await expect(enter(theirs.fleetNumber)).rejects.toMatchObject(said);
    await expect(enter('no such unit')).rejects.toMatchObject(said);
    expect(await casesOf(workshop, theirs.unitId)).toEqual([]);
    // One gate knows nothing of another's passages.
    const ours = await makeAUnit(workshop);
    const [passageId, second] = [newId(), await makeAGate({ ...workshop, siteId: elsewhere })];
    await enterGate({ visitor: visitor(), input: { token, id: passageId, fleetNumber: ours.fleetNumber.toUpperCase(), name: 'Kim', complaints: ['complaint-oil'] } });
    await expect(viewGatePage({ visitor: visitor(), input: { token: second.token, passageId } })).resolves.toMatchObject({ step: 'enter' });
    await expect(answerGate({ visitor: visitor(), input: { token: second.token, passageId, id: newId(), checkId: 'onset', state: 'suddenly' } })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('bears no guessing of numbers', async () => {
    const [{ token }, guesser] = [await makeAGate(workshop), visitor()];
    const guess = (n: number) => enterGate({ visitor: guesser, input: { token, id: newId(), fleetNumber: `guess ${n}`, name: 'Kim', complaints: ['complaint-oil'] } }).then(() => 'in', (error: { code: string }) => error.code);
    const answers = [];
    for (let n = 0; n < 41; n++) answers.push(await guess(n));
    expect(answers.slice(0, 40)).toEqual(Array(40).fill('invalid'));
    expect(answers[40]).toBe('too-many');
  });
});

describe('a passage', () => {
  it.each([['nobody can tell', cannotTell], ['worn rings', speaksFor('rings-worn')], ['a carboned line', speaksFor('discharge-line-carboned')]])('asks five checks and seven minutes at most, of a vehicle as it stands: %s', async (_, answer) => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber } = await makeAUnit(workshop);
    const { asked } = await walk({ visitor: visitor(), token, fleetNumber, answer, clock });
    expect(asked.length).toBeGreaterThan(0);
    expect(asked.length).toBeLessThanOrEqual(5);
    expect(asked.reduce((sum, { minutes }) => sum + minutes, 0)).toBeLessThanOrEqual(7);
    expect(new Set(asked.map(({ check }) => check.id)).size).toBe(asked.length);
    for (const { check } of asked) expect(isForTheGate(defaultRulebook.checks.find(({ id }) => id === check.id) ?? { setUp: { engine: 'idle' } })).toBe(true);
    expect(asked.map(({ check }) => check.id).filter((id) => id.startsWith('complaint-'))).toEqual([]);
  });

  it('has the cautions read before the answer', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber } = await makeAUnit(workshop);
    const passageId = newId();
    await enterGate({ visitor: visitor(), input: { token, id: passageId, fleetNumber, name: 'Kim', complaints: ['complaint-oil'] } });
    for (;;) {
      clock.forward(1000);
      const page = await viewGatePage({ visitor: visitor(), input: { token, passageId } });
      if (page.step !== 'check') throw new Error('no check with a caution came');
      const [state] = page.check.states;
      const answer = { token, passageId, id: newId(), checkId: page.check.id, ...(state ? { state: state.id } : { value: '5' }) };
      if (page.check.cautions.length > 0) {
        await expect(answerGate({ visitor: visitor(), input: answer })).rejects.toMatchObject({ fields: { hasReadCautions: expect.any(String) } });
        await answerGate({ visitor: visitor(), input: { ...answer, hasReadCautions: true } });
        break;
      }
      await answerGate({ visitor: visitor(), input: { ...answer, cannotTell: true } });
    }
    await expect(answerGate({ visitor: visitor(), input: { token, passageId, id: newId(), checkId: 'air-delivery', state: 'none', hasReadCautions: true } })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('says “fit” when the answers point to the compressor itself, and opens a case that is nobody’s yet', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber, unitId } = await makeAUnit(workshop);
    const { page, passageId, asked } = await walk({ visitor: visitor(), token, fleetNumber, answer: worn, complaints: ['complaint-oil', 'complaint-slow-air'], clock });
    expect(page).toMatchObject({ verdict: 'fit', fleetNumber, isMoreKnown: expect.any(Boolean) });
    expect(page.reasons.map(({ cause }) => cause)).toContain('Rings worn');
    const [opened, ...others] = await casesOf(workshop, unitId);
    expect(others).toEqual([]);
    expect(opened).toMatchObject({ status: 'open', opened_by: null, opened_by_name: 'Kim, at the gate “Parts counter”', assigned_to: null });
    const { head, state: { findings, causes } } = await readCase({ ctx: workshop.ctx, input: { caseId: opened?.id ?? '' } });
    expect(head.openedBy).toBe('Kim, at the gate “Parts counter”');
    expect(causes[0]?.causeId).toBe('rings-worn');
    for (const { check } of asked) expect(findings.find(({ checkId }) => checkId === check.id)).toMatchObject({ person: 'Kim, at the gate “Parts counter”' });
    const { rows } = await workshop.asOwner((tx) => tx.execute(sql`select verdict, edition_id, case_id, jsonb_array_length(reasons) as reasons, (select count(*)::int from gate_answer where passage_id = ${passageId}) as answers from gate_passage where id = ${passageId}`));
    expect(rows).toEqual([{ verdict: 'fit', edition_id: workshop.editionId, case_id: opened?.id, reasons: expect.any(Number), answers: asked.length }]);
  });

  it('says “not yet, because” with the answers that speak for something else', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber } = await makeAUnit(workshop);
    const { page } = await walk({ visitor: visitor(), token, fleetNumber, answer: speaksFor('drain-choked-by-sealant'), clock });
    expect(page.verdict).toBe('not-yet');
    const reason = page.reasons.find(({ cause }) => cause === 'Drain choked by sealant');
    expect(reason?.because[0]).toMatchObject({ check: expect.any(String), answer: expect.any(String), word: expect.stringMatching(/clearly|strongly|almost by itself|a little/) });
  });

  it('adds to the open case of the unit', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber, unitId } = await makeAUnit(workshop);
    const caseId = newId();
    await openCase({ ctx: workshop.ctx, input: { id: caseId, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
    clock.forward(60_000);
    const { asked } = await walk({ visitor: visitor(), token, fleetNumber, complaints: ['complaint-noise'], answer: speaksFor('drain-choked-by-sealant'), clock });
    expect(await casesOf(workshop, unitId)).toMatchObject([{ id: caseId }]);
    const { state: { findings } } = await readCase({ ctx: workshop.ctx, input: { caseId } });
    expect(findings.map(({ checkId }) => checkId)).toEqual(expect.arrayContaining(['complaint-noise', ...asked.map(({ check }) => check.id)]));
    expect(findings.filter(({ checkId }) => checkId === 'complaint-oil')).toHaveLength(1);
  });

  it('names no cause that only the workshop’s own record speaks for', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber } = await makeAUnit(workshop);
    const { page } = await walk({ visitor: visitor(), token, fleetNumber, answer: cannotTell, clock });
    expect(page.reasons.every(({ because }) => because.length > 0)).toBe(true);
    expect(JSON.stringify(page)).not.toMatch(/"caseId"|"number"|"p":/);
  });

  it('is one, however often each of its forms is sent', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber, unitId } = await makeAUnit(workshop);
    const { passageId, asked } = await walk({ visitor: visitor(), token, fleetNumber, answer: speaksFor('rings-worn'), clock, times: 2 });
    const { rows } = await workshop.asOwner((tx) => tx.execute(sql`
      select (select count(*)::int from gate_passage where unit_id = ${unitId}) as passages, (select count(*)::int from gate_answer where passage_id = ${passageId}) as answers,
             (select count(*)::int from finding f join "case" c on c.organisation_id = f.organisation_id and c.id = f.case_id where c.unit_id = ${unitId} and f.asked_because = 'suggested') as findings`));
    expect(await casesOf(workshop, unitId)).toHaveLength(1);
    expect(rows).toEqual([{ passages: 1, answers: asked.length, findings: asked.length }]);
  });

  it('holds the unit where an answer forbids its release', async () => {
    const { token } = await makeAGate(workshop);
    const { fleetNumber, unitId } = await makeAUnit(workshop);
    const { page } = await walk({ visitor: visitor(), token, fleetNumber, answer: ({ id, states }) => (id === 'oil-in-service-tanks' ? { state: 'yes' } : states[0] ? { state: states[0].id } : null), clock });
    const { rows } = await workshop.asOwner((tx) => tx.execute<{ check_id: string }>(sql`select check_id from unit_hold where unit_id = ${unitId}`));
    expect(rows.map(({ check_id }) => defaultRulebook.checks.find(({ id }) => id === check_id)?.name)).toEqual(page.forbids);
  });

  it('keeps two organisations with the same number apart', async () => {
    const theirs = await makeWorkshop(databases, { now: clock.now });
    const fleetNumber = `K-${newId().slice(-6)}`;
    const [ours, other] = [await makeAUnit(workshop, fleetNumber), await makeAUnit(theirs, fleetNumber)];
    const { token } = await makeAGate(theirs);
    const { passageId } = await walk({ visitor: visitor(), token, fleetNumber, answer: speaksFor('rings-worn'), clock });
    expect(await casesOf(workshop, ours.unitId)).toEqual([]);
    expect(await casesOf(theirs, other.unitId)).toHaveLength(1);
    const mine = await makeAGate(workshop);
    await expect(viewGatePage({ visitor: visitor(), input: { token: mine.token, passageId } })).resolves.toMatchObject({ step: 'enter' });
    const { rows } = await workshop.asOwner((tx) => tx.execute(sql`select 1 from gate_passage where unit_id = ${ours.unitId}`));
    expect(rows).toEqual([]);
  });
});
