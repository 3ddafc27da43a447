import { expect } from 'vitest';
import fc from 'fast-check';
import { featuresOf, randomCases, type CaseFeatures, type RandomCase, type RandomShape } from '@/tests/support/random-rulebook';

/** The mix that `diagnosis.md` asks of the rulebooks that properties are tried on. */
const LEAST_SHARE = 0.3;

/**
 * Tries a property on random cases, and then asserts that the cases were worth trying: at least 30 % each with compound
 * rules, checks of three or more states, groups of three or more, and split answers. The seed is fixed: a suite that
 * is green by luck, or red by it, proves nothing.
 */
export async function forAllCases(
  holds: (each: RandomCase, seed: number) => void | Promise<void>,
  { runs = 200, shape = {}, except = [] }: { runs?: number; shape?: Partial<RandomShape>; except?: (keyof CaseFeatures)[] } = {},
): Promise<void> {
  const seen: CaseFeatures[] = [];
  await fc.assert(
    fc.asyncProperty(randomCases(shape), fc.nat(), async (each, seed) => {
      seen.push(featuresOf(each));
      await holds(each, seed);
    }),
    { numRuns: Math.min(runs, fc.readConfigureGlobal().numRuns ?? runs), seed: 20_260 },
  );
  for (const feature of ['compoundRules', 'threeStates', 'groupOfThree', 'splitAnswers'] as const) {
    if (except.includes(feature)) continue;
    const share = seen.filter((features) => features[feature]).length / seen.length;
    expect(share, `share of cases with ${feature}`).toBeGreaterThanOrEqual(LEAST_SHARE);
  }
}
