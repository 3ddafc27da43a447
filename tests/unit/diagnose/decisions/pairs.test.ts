import { describe, expect, it } from 'vitest';
import { compileRulebook, natsOf, rank, type Finding, type Rulebook } from '@/lib/diagnose';
import { rankPairs } from '@/lib/diagnose/pairs';
import { inhibition, noisyOr } from '@/lib/diagnose/pairs-noisy-or';
import { book, cause, choice, finding, rule, somethingElse } from '../../../support/rulebook-parts';

/** Each cause brings about one sign and makes the other somewhat rarer than it is by itself. */
const rulebook: Rulebook = book({
  causes: [cause('leak', 0.3), cause('worn', 0.3), cause('normal-carryover', 0.3), somethingElse(0.1)],
  checks: [choice('hiss', { present: 0.1, absent: 0.9 }), choice('smoke', { present: 0.1, absent: 0.9 }), choice('oil', { little: 0.5, some: 0.3, much: 0.2 })],
  rules: [
    rule('hiss', { hiss: 'present' }, { leak: 9.5, worn: -9, 'normal-carryover': -9 }),
    rule('smoke', { smoke: 'present' }, { worn: 9.5, leak: -9, 'normal-carryover': -9 }),
    rule('much oil', { oil: 'much' }, { worn: 6, leak: -6 }),
  ],
});
rulebook.settings.defaultRho = 1;
const compiled = compileRulebook(rulebook);
const both: Finding[] = [finding('hiss', 'present'), finding('smoke', 'present')];

describe('two causes at once', () => {
  it('are offered when each explains what the other does not', () => {
    const { offered, pairs, bestSingle } = rankPairs(compiled, both);
    expect(offered).toBe(true);
    expect(pairs[0]?.causeIds).toEqual(['leak', 'worn']);
    expect(pairs[0]?.aheadDecibans).toBeGreaterThanOrEqual(3);
    expect(bestSingle).toBe(rank(compiled, both).causes[0]?.causeId);
  });

  it('are not offered when one cause explains all', () => {
    expect(rankPairs(compiled, [finding('hiss', 'present'), finding('smoke', 'absent')]).offered).toBe(false);
    expect(rankPairs(compiled, []).offered).toBe(false);
  });

  it('never hold "nothing to repair" or "something else"', () => {
    const named = rankPairs(compiled, both).pairs.flatMap(({ causeIds }) => causeIds);
    expect(new Set(named)).toEqual(new Set(['leak', 'worn']));
  });

  it('score as the formula says: ln priors, and ln of noisy-OR over background', () => {
    const leak = 0.1;
    const q = inhibition(leak * Math.exp(natsOf(9.5)), leak);
    const present = noisyOr(leak, [q, 1]);
    expect(rankPairs(compiled, both).pairs[0]?.scoreNats).toBeCloseTo(2 * Math.log(0.3) + 2 * Math.log(present / leak), 12);
    const absent = rankPairs(compiled, [finding('hiss', 'absent')]).pairs[0]?.scoreNats;
    expect(absent).toBeCloseTo(2 * Math.log(0.3) + Math.log((1 - present) / (1 - leak)), 12);
  });

  it('take an answer of any other check as coming from either alike', () => {
    const score = rankPairs(compiled, [finding('oil', 'much')]).pairs[0]?.scoreNats;
    expect(score).toBeCloseTo(2 * Math.log(0.3) + Math.log((10 ** 0.6 + 10 ** -0.6) / 2), 12);
  });

  it('weigh "think so" as singles do', () => {
    const leak = 0.1;
    const present = noisyOr(leak, [inhibition(leak * Math.exp(natsOf(9.5)), leak), 1]);
    const score = rankPairs(compiled, [finding('hiss', 'present', { reliability: 0.8 })]).pairs[0]?.scoreNats;
    expect(score).toBeCloseTo(2 * Math.log(0.3) + Math.log((0.8 * present) / leak + 0.2), 12);
  });

  it('stay finite when a cause makes a sign certain', () => {
    const sure = structuredClone(rulebook);
    sure.rules = [rule('hiss', { hiss: 'absent' }, { leak: -3000 })];
    expect(rankPairs(compileRulebook(sure), [finding('hiss', 'absent')]).pairs.every(({ scoreNats }) => Number.isFinite(scoreNats))).toBe(true);
  });
});

describe('leaky noisy-OR', () => {
  it('of one cause is that cause, and of none the leak', () => {
    expect(noisyOr(0.02, [inhibition(0.7, 0.02)])).toBeCloseTo(0.7, 12);
    expect(noisyOr(0.02, [])).toBeCloseTo(0.02, 12);
  });

  it('never lets a cause make a sign rarer than it is by itself', () => {
    expect(inhibition(0.01, 0.02)).toBe(1);
  });
});
