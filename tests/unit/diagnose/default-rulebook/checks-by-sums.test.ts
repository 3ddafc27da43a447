import { describe, expect, it } from 'vitest';
import { compileRulebook, rank } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';

const compiled = compileRulebook(defaultRulebook);

/** ln of how much the odds of a cause to something else grow by these answers, each sure. */
function lift(cause: string, ...answers: [check: string, state: string][]): number {
  const findings = answers.map(([checkId, state]) => ({ id: checkId, checkId, stage: { kind: 'diagnosis' as const }, shares: [{ state, share: 1 }], reliability: 1 }));
  const odds = (given: typeof findings) => {
    const p = (id: string) => rank(compiled, given).causes.find(({ causeId }) => causeId === id)?.p ?? NaN;
    return Math.log(p(cause) / p('something-else'));
  };
  return odds(findings) - odds([]);
}

/** What only a sum makes possible, and the check that looks at the same fact from another side. */
const SAME_FACT = [
  ['discharge-line-carboned', ['build-up-against-expected', 'much-longer'], ['build-up-time', 'very-slow']],
  ['system-leaks', ['leak-share-of-duty', 'over-10'], ['leak-down-released', 'over-6']],
  ['discharge-line-carboned', ['line-loss-ratio', 'over-50'], ['line-bore', 'under-6']],
  ['drain-choked-by-sealant', ['oil-per-loaded-hour', 'very-much'], ['oil-caught', 'very-much']],
] as const;

describe('checks that only a sum makes possible', () => {
  it.each(SAME_FACT)('point to %s by %j more modestly than %j, and are not counted twice beside it', (cause, ofSum, plain) => {
    const [bySum, byItself, both] = [lift(cause, [...ofSum]), lift(cause, [...plain]), lift(cause, [...ofSum], [...plain])];
    expect(bySum).toBeGreaterThan(0);
    expect(bySum).toBeLessThan(byItself);
    expect(both).toBeGreaterThan(byItself - 1e-9);
    expect(both).toBeLessThan(byItself + 0.55 * bySum);
  });

  it('tell one that works all day from one that is worn: leaks explain oil an hour, not oil a loaded hour', () => {
    expect(lift('system-leaks', ['oil-per-loaded-hour', 'very-little'])).toBeGreaterThan(lift('system-leaks', ['oil-caught', 'very-little']));
    expect(lift('rings-worn', ['oil-per-loaded-hour', 'much'])).toBeGreaterThan(lift('system-leaks', ['oil-per-loaded-hour', 'much']));
  });

  it('clear the compressor where leaks explain a slow build-up', () => {
    expect(lift('system-leaks', ['build-up-against-expected', 'as-expected'])).toBeGreaterThan(0);
    expect(lift('valve-leaking', ['build-up-against-expected', 'as-expected'])).toBeLessThan(0);
  });
});
