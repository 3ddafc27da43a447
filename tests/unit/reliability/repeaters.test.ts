import { describe, expect, it } from 'vitest';
import { FALSE_DISCOVERY_RATE, GREATEST_DISPERSION, repeaters } from '@/lib/reliability/repeats/repeaters';
import { seededRandom, type Random } from '@/tests/support/random';
import { gammaDraw, poissonDraw } from '@/tests/support/reliability-draws';

const UNITS = 10_000;
const RATE = 0.05;

/** Units that ran 60 to 120 thousand miles: about four and a half failures each. */
function fleetOf(seed: number, times: (random: Random, i: number) => number = () => 1) {
  const random = seededRandom(seed);
  return Array.from({ length: UNITS }, (_, i) => {
    const exposure = random.between(60, 120);
    return { exposure, count: poissonDraw(random, RATE * exposure * times(random, i)) };
  });
}

function flagsOf(units: ReturnType<typeof fleetOf>) {
  const found = repeaters(units);
  if (found.kind === 'not-estimable') throw new Error(found.why);
  return { dispersion: found.dispersion, flags: found.units.map((unit) => unit?.above != null) };
}

const count = (flags: readonly boolean[]) => flags.filter(Boolean).length;

describe('10,000 units', () => {
  it('that are all equal: fleets in which any is flagged are at most as many as is stated', () => {
    const fleets = Array.from({ length: 20 }, (_, seed) => count(flagsOf(fleetOf(seed + 1)).flags));
    // At 5 %, four or more of 20 fleets would be met once in 60.
    expect(fleets.filter((flags) => flags > 0).length).toBeLessThanOrEqual(3);
    expect(Math.max(...fleets) / UNITS).toBeLessThanOrEqual(FALSE_DISCOVERY_RATE);
  });

  it.each([1, 2, 3])('with 100 planted at four times the rate: at least 60 are found, hardly any other (seed %i)', (seed) => {
    const { flags } = flagsOf(fleetOf(seed, (_, i) => (i < 100 ? 4 : 1)));
    const [found, others] = [count(flags.slice(0, 100)), count(flags.slice(100))];
    expect(found).toBeGreaterThanOrEqual(60);
    expect(others / (found + others)).toBeLessThanOrEqual(2 * FALSE_DISCOVERY_RATE);
  });

  it('whose rates vary widely: few are flagged where chance alone would flag a good part', () => {
    const { dispersion, flags } = flagsOf(fleetOf(5, (random) => gammaDraw(random, { shape: 1, mean: 1 })));
    expect(dispersion).toBeGreaterThan(GREATEST_DISPERSION);
    expect(count(flags) / UNITS).toBeLessThan(0.12);
  });
});

describe('small fleets', () => {
  it('say why nothing can be said', () => {
    expect(repeaters([])).toEqual({ kind: 'not-estimable', why: 'too-few-units' });
    expect(repeaters([{ count: 3, exposure: 10 }, { count: 0, exposure: 0 }])).toEqual({ kind: 'not-estimable', why: 'too-few-units' });
    expect(repeaters([{ count: 0, exposure: 10 }, { count: 0, exposure: 5 }])).toEqual({ kind: 'not-estimable', why: 'no-failures' });
  });

  it('leave out a unit that never ran, and keep one that never failed', () => {
    const found = repeaters([{ count: 3, exposure: 10 }, { count: 0, exposure: 0 }, { count: 0, exposure: 12 }]);
    expect(found).toMatchObject({ units: [{ above: null }, null, { p: 1 }] });
  });

  it('refuse failures without exposure', () => {
    expect(() => repeaters([{ count: 1, exposure: 0 }, { count: 0, exposure: 3 }])).toThrow(RangeError);
  });
});
