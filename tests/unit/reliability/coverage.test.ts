import { describe, expect, it } from 'vitest';
import { BAND, COVERAGE, coverageOf } from '@/tests/support/coverage/methods';
import { seededRandom } from '@/tests/support/random';

const FLEETS = 200;
/** So many fleets alone are off by that much: one standard error of a share of 95 %. */
const ALLOWANCE = Math.sqrt((0.95 * 0.05) / FLEETS);

/** `npm run test:coverage-of-intervals` draws 1,000. */
describe('95 % intervals over 200 fleets', () => {
  it.each(COVERAGE)('hold the truth about as often as they say: $name, $size', (method) => {
    const { share, estimable } = coverageOf(method, FLEETS, seededRandom);
    expect(estimable).toBeGreaterThan(0.9 * FLEETS);
    expect(share).toBeGreaterThanOrEqual(BAND.least - ALLOWANCE);
    expect(share).toBeLessThanOrEqual(BAND.most + ALLOWANCE);
  });
});
