import { describe, expect, it, vi } from 'vitest';
import { compileRulebook, compileTrusted, rank, type CompiledRulebook, type Finding } from '@/lib/diagnose';
import { fireRules, runOfRecord } from '@/lib/diagnose/record-run';
import { book, cause, choice, finding, measured, rule, somethingElse } from '@/tests/support/rulebook-parts';
import { forAllCases } from './for-all-cases';

vi.setConfig({ testTimeout: 60_000 });

const small = compileRulebook(
  book({
    causes: [somethingElse(0.2), cause('worn', 0.3), cause('choked', 0.5)],
    checks: [choice('noise', { knock: 0.1, none: 0.9 }), choice('colour', { black: 0.3, milky: 0.2, clean: 0.5 }), measured('pressure', [100, 200], [0.3, 0.4, 0.3])],
    rules: [
      rule('knock', { noise: 'knock' }, { worn: 6 }),
      { ...rule('not clean', {}, { choked: 2 }), conditions: { all: [{ fact: 'colour', operator: 'notIn', value: ['clean'] }] } },
      { ...rule('low', {}, { choked: 4, worn: -2 }), conditions: { all: [{ fact: 'pressure', operator: 'lessThan', value: 100 }] } },
      { ...rule('high', {}, { worn: 3 }), conditions: { all: [{ fact: 'pressure', operator: 'greaterThanInclusive', value: 200 }] } },
      {
        ...rule('quiet and low', {}, { choked: 3 }),
        conditions: { all: [{ fact: 'noise', operator: 'notEqual', value: 'knock' }, { fact: 'pressure', operator: 'lessThan', value: 200 }] },
      },
    ],
  }),
);

describe('the run of record', () => {
  it('fires what the compiled predicates fire and ranks alike to the last bit, for any rulebook', () =>
    forAllCases(async ({ rulebook, findings }) => {
      const compiled = compileTrusted(rulebook);
      const run = await runOfRecord(compiled, findings);
      expect(run.difference).toBeUndefined();
      expect(run.agreed).toBe(true);
      expect(run.ranking).toEqual(rank(compiled, findings));
      expect(run.engineFired).toEqual(run.ranking.fired);
    }));

  it('leaves out no rule that could fire: with all rules in the engine the same fire', () =>
    forAllCases(async ({ rulebook, findings }) => {
      const compiled = compileTrusted(rulebook);
      const sure = findings.filter(({ shares }) => shares.length === 1);
      const facts = new Map(sure.map(({ checkId, shares }) => [checkId, factFor(compiled, checkId, shares[0]?.state)]));
      const all = await fireRules(compiled.rules.values(), facts);
      expect(all.map(({ name }) => name)).toEqual((await runOfRecord(compiled, sure)).engineFired);
    }, { except: ['splitAnswers'] }));

  it('fires nothing on unanswered checks, for notEqual and notIn either', async () => {
    expect((await runOfRecord(small, [])).engineFired).toEqual([]);
    expect((await runOfRecord(small, [finding('pressure', 'band-0')])).engineFired).toEqual(['low']);
    expect((await fireRules(small.rules.values(), new Map())).length).toBe(0);
  });

  it('reads no number out of a text', async () => {
    expect((await fireRules(small.rules.values(), new Map([['pressure', '12abc']]))).length).toBe(0);
  });

  it('keeps runs apart that overlap, though they share rules', async () => {
    const cases: Finding[][] = [
      [],
      [finding('noise', 'knock')],
      [finding('noise', 'none'), finding('pressure', 'band-1')],
      [finding('pressure', { 'band-0': 0.4, 'band-1': 0.6 }), finding('colour', 'milky')],
      [finding('pressure', 'band-2'), finding('noise', 'knock', { reliability: 0.8 }), finding('colour', 'clean')],
    ];
    const runs = await Promise.all(Array.from({ length: 60 }, (_, index) => runOfRecord(small, cases[index % cases.length] ?? [])));
    runs.forEach((run, index) => {
      expect(run.agreed).toBe(true);
      expect(run.ranking).toEqual(rank(small, cases[index % cases.length] ?? []));
    });
  });

  it('follows the engine where the two differ, and says in which rules', async () => {
    const blind: CompiledRulebook = { ...small, checks: new Map(small.checks), compoundRules: [] };
    const noise = small.checks.get('noise');
    if (!noise) throw new Error('no noise');
    (blind.checks as Map<string, typeof noise>).set('noise', { ...noise, rulesByState: noise.stateIds.map(() => []) });
    const findings = [finding('noise', 'knock'), finding('pressure', 'band-0')];
    const run = await runOfRecord(blind, findings);
    expect(run.agreed).toBe(false);
    expect(run.difference).toEqual({ engineOnly: ['knock'], compiledOnly: [] });
    expect(run.ranking).toEqual(rank(small, findings));
    expect(run.ranking).not.toEqual(rank(blind, findings));
  });
});

function factFor(compiled: CompiledRulebook, checkId: string, state: string | undefined): string | number {
  const check = compiled.checks.get(checkId);
  return check?.facts[check.stateIndex.get(state ?? '') ?? -1] ?? '';
}
