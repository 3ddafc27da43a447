import { describe, expect, it } from 'vitest';
import { compileRulebook, parseRulebook, rank } from '@/lib/diagnose';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { logLoss, multiClassBrier, topShare, type Prediction } from '@/lib/diagnose/scores';
import { compareEditions } from '@/lib/rulebook/back-test/compare-editions';
import { moveWeight } from '@/lib/rulebook/back-test/move-weight';
import { prepareCases } from '@/lib/rulebook/back-test/prepare';
import type { ProvedCase } from '@/lib/rulebook/proved-case';
import { listedCauses, randomProvedCases, withWeight } from '@/tests/support/proved-cases';
import { caseOf } from '@/tests/support/random-rulebook';
import { seededRandom } from '@/tests/support/random';
import { forAllCases } from '@/tests/unit/diagnose/core/for-all-cases';

type Compiled = ReturnType<typeof compileRulebook>;

async function byEngine(compiled: Compiled, cases: readonly ProvedCase[]) {
  const predictions: Prediction[] = [];
  const leaders: string[] = [];
  for (const { findings, truth } of cases) {
    const { ranking, agreed } = await runOfRecord(compiled, findings);
    expect(agreed).toBe(true);
    const p = new Map(ranking.causes.map((cause) => [cause.causeId, cause.p]));
    predictions.push({ p: compiled.causeIds.map((id) => p.get(id) ?? NaN), truth: compiled.causeIds.indexOf(truth) });
    leaders.push(ranking.causes[0]?.causeId ?? '');
  }
  return { predictions, leaders };
}

describe('a back-test', () => {
  it('ranks prepared cases as `rank` does', async () => {
    await forAllCases(({ rulebook }, seed) => {
      const compiled = compileRulebook(rulebook);
      const cases = randomProvedCases(rulebook, 5, seed);
      prepareCases(compiled, cases).cases.forEach(({ scores }, index) => {
        for (const { causeId, scoreNats } of rank(compiled, cases[index]?.findings ?? []).causes) {
          expect(scores[compiled.causeIds.indexOf(causeId)]).toBeCloseTo(scoreNats, 10);
        }
      });
    }, { runs: 60 });
  });

  it('of a moving weight is the engine’s run of every case with the changed rulebook', async () => {
    let [tried, incoherent, changedLeaders] = [0, 0, 0];
    await forAllCases(async ({ rulebook }, seed) => {
      const random = seededRandom(seed);
      if (rulebook.rules.length === 0) return;
      const { name, weights } = random.pick(rulebook.rules);
      // A weight that is there, or one that the rule has not given so far.
      const causeId = random.chance(0.7) ? random.pick(Object.keys(weights)) : random.pick(listedCauses(rulebook));
      const compiled = compileRulebook(rulebook);
      const cases = randomProvedCases(rulebook, 12, seed);
      const moving = moveWeight(prepareCases(compiled, cases), name, causeId);
      const before = await byEngine(compiled, cases);
      expect(moving.before?.logLoss).toBeCloseTo(logLoss(before.predictions), 10);

      const decibans = random.between(-9, 5);
      const changed = withWeight(rulebook, name, causeId, decibans);
      const moved = moving.at(decibans);
      const parsed = parseRulebook(changed);
      if (!parsed.ok) {
        // Two rules of one check may not both give a cause a weight for one answer: the schema's to say.
        if (parsed.problems.some(({ message }) => message.includes('a weight for'))) return;
        expect(moved.kind).toBe('incoherent');
        incoherent += 1;
        return;
      }
      if (moved.kind !== 'moved') throw new Error(`incoherent at ${decibans} dB`);
      tried += 1;
      const after = await byEngine(compileRulebook(changed), cases);
      expect(moved.scores?.logLoss).toBeCloseTo(logLoss(after.predictions), 10);
      expect(moved.scores?.brier).toBeCloseTo(multiClassBrier(after.predictions), 10);
      expect(moved.scores?.top1).toBeCloseTo(topShare(after.predictions, 1), 10);
      expect(moved.scores?.top3).toBeCloseTo(topShare(after.predictions, 3), 10);
      const leaders = cases.flatMap(({ id }, index) => {
        const [from = '', to = ''] = [before.leaders[index], after.leaders[index]];
        return from === to ? [] : [{ caseId: id, from, to }];
      });
      expect(moved.leaders).toEqual(leaders);
      changedLeaders += leaders.length;

      const losses = after.predictions.map((each, index) => logLoss([each]) - logLoss(before.predictions.slice(index, index + 1)));
      const mean = losses.reduce((a, b) => a + b, 0) / losses.length;
      const variance = losses.reduce((a, b) => a + (b - mean) ** 2, 0) / (losses.length - 1);
      expect(moved.logLoss.mean).toBeCloseTo(mean, 10);
      expect(moved.logLoss.standardError).toBeCloseTo(Math.sqrt(variance / losses.length), 7);
    }, { runs: 120 });
    expect(tried).toBeGreaterThan(50);
    expect(incoherent).toBeGreaterThan(5);
    expect(changedLeaders).toBeGreaterThan(10);
  });

  it('says the largest weight allowed as the schema does, and takes one just below it', () => {
    const { rulebook } = caseOf({ seed: 5, causes: 4, checks: 5, compounds: 0, groups: 1, states: 4, split: 0, beta: 1, rho: 0.5 });
    const compiled = compileRulebook(rulebook);
    const prepared = prepareCases(compiled, randomProvedCases(rulebook, 10, 1));
    let tried = 0;
    for (const { name, weights } of rulebook.rules) {
      for (const causeId of Object.keys(weights)) {
        const moving = moveWeight(prepared, name, causeId);
        const moved = moving.at(60);
        if (moved.kind !== 'incoherent' || moved.largest === undefined) throw new Error(`${name} takes 60 dB`);
        expect(moving.at(moved.largest - 1e-6).kind).toBe('moved');
        const parsed = parseRulebook(withWeight(rulebook, name, causeId, 60));
        const said = parsed.ok ? undefined : /allowed here is (.*) dB/.exec(parsed.problems[0]?.instead ?? '')?.[1];
        if (said === undefined) continue; // Every answer is given: there is one weight that fits, and no largest.
        expect(moved.largest - Number(said)).toBeGreaterThan(0);
        expect(moved.largest - Number(said)).toBeLessThan(0.011);
        tried += 1;
      }
    }
    expect(tried).toBeGreaterThan(5);
  });

  it('compares a draft with what is published, and says what it could not be tried on', () => {
    const { rulebook } = caseOf({ seed: 11, causes: 4, checks: 6, compounds: 2, groups: 1, states: 4, split: 0.5, beta: 1, rho: 0.5 });
    const cases = randomProvedCases(rulebook, 40, 3);
    const published = compileRulebook(rulebook);
    const same = compareEditions(published, published, cases);
    expect(same).toMatchObject({ worse: false, leaders: [], notTried: [], findingsLost: [], logLoss: { mean: 0 } });
    expect(same.before).toEqual(same.after);

    const [gone] = rulebook.checks;
    const mentions = ({ conditions }: (typeof rulebook.rules)[number]) => JSON.stringify(conditions).includes(`"${gone?.id}"`);
    const draft = compileRulebook({ ...rulebook, checks: rulebook.checks.slice(1), rules: rulebook.rules.filter((rule) => !mentions(rule)) });
    const less = compareEditions(published, draft, [...cases, { id: 'of-a-new-cause', truth: 'not-listed', findings: [] }]);
    expect(less.findingsLost.length).toBeGreaterThan(10);
    expect(less.findingsLost.every(({ checkId }) => checkId === gone?.id)).toBe(true);
    expect(less.notTried).toEqual([{ caseId: 'of-a-new-cause', lacks: 'published' }]);
    expect(less.before?.cases).toBe(40);
  });
});
