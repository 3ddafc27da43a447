import { describe, expect, it } from 'vitest';
import { SOMETHING_ELSE } from '@/lib/diagnose';
import { compiled } from './findings';

/**
 * A background rate is the share of an answer over all cases, so the causes' own rates, mixed by their priors, must
 * give it back. Weights are written to half a deciban, which leaves a few hundredths of play.
 */
describe('background rates', () => {
  it.each([...compiled.checks.values()])('of $id are the mix of all causes', ({ stateIds, backgrounds, table }) => {
    stateIds.forEach((state, v) => {
      const background = backgrounds[v] ?? 0;
      const mix = compiled.causeIds.reduce((sum, _, c) => sum + (compiled.priors[c] ?? 0) * background * Math.exp(table[v]?.[c] ?? 0), 0);
      expect(Math.abs(mix - background), state).toBeLessThan(0.035);
      expect(Math.abs(Math.log(mix / background)), state).toBeLessThan(0.12);
    });
  });

  it('are what "something else" sits at', () => {
    const c = compiled.causeIndex.get(SOMETHING_ELSE) ?? -1;
    for (const { table } of compiled.checks.values()) for (const state of table) expect(state[c]).toBe(0);
  });
});
