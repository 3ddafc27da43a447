import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { band } from '@/lib/air-and-oil/band';
import { sumOfUniforms } from '@/lib/air-and-oil/sum-of-uniforms';
import { BAND_COVERAGE } from '@/lib/air-and-oil/band-coverage';
import { SUMS, sumOf, type Sum } from '@/lib/air-and-oil/sums';
import { coverage, tripled, type Scenario } from './draws';

const DRAWS = 10_000;

function known(id: string): Sum {
  const sum = sumOf(id);
  if (!sum) throw new Error(`no sum ${id}`);
  return sum;
}

const psi = 6894.757;
const cfm = 0.000471947;
const none = (sum: Sum) => Object.fromEntries(sum.inputs.map(({ id }) => [id, 0]));
const onlyOff = (id: string, input: string, halfWidth: number) => ({ ...none(known(id)), [input]: halfWidth });

const SCENARIOS: Record<string, Scenario[]> = {
  'build-up': [
    { name: 'as usual' },
    { name: 'delivery alone, off by a fifth', halfWidths: onlyOff('build-up', 'delivery', 2.4 * cfm) },
    { name: 'volume alone', halfWidths: onlyOff('build-up', 'volume', 0.01) },
    { name: 'a coarse gauge alone', halfWidths: onlyOff('build-up', 'toPressure', 3 * psi) },
    { name: 'a large leak that is hardly known', given: { leak: 4 * cfm }, halfWidths: { leak: 2 * cfm } },
    { name: 'everything badly known', given: { leak: 2 * cfm }, halfWidths: { delivery: 2 * cfm, leak: cfm, volume: 0.01, fromPressure: 2 * psi, toPressure: 2 * psi } },
  ],
  'leak-down': [
    { name: 'as usual' },
    { name: 'no fall at all', given: { endPressure: 120 * psi } },
    { name: 'time alone', halfWidths: onlyOff('leak-down', 'time', 10) },
    { name: 'one reading of the gauge alone', halfWidths: onlyOff('leak-down', 'endPressure', 2 * psi) },
    { name: 'temperatures badly known', halfWidths: { startTemperature: 3, endTemperature: 3 } },
    { name: 'a long test', given: { time: 3600, endPressure: 60 * psi }, halfWidths: { volume: 0.02 } },
    { name: 'a very short test', given: { time: 10 }, halfWidths: { time: 3 } },
  ],
  'time-loaded': [
    { name: 'as usual' },
    { name: 'short cycles', given: { loaded: 4, unloaded: 6 }, halfWidths: { loaded: 2, unloaded: 2 } },
    { name: 'hardly ever unloaded', given: { loaded: 100, unloaded: 5 }, halfWidths: { loaded: 3, unloaded: 3 } },
    { name: 'unloaded alone', halfWidths: onlyOff('time-loaded', 'unloaded', 60) },
  ],
  delivery: [
    { name: 'as usual' },
    { name: 'bore alone, off by a twentieth', halfWidths: onlyOff('delivery', 'bore', 0.0035) },
    { name: 'speed alone', halfWidths: onlyOff('delivery', 'engineSpeed', 5) },
    { name: 'much clearance, badly known', given: { clearance: 0.1 }, halfWidths: { clearance: 0.03 } },
    { name: 'high up', given: { altitude: 2500 }, halfWidths: { otherLosses: 0.1 } },
  ],
  'carry-over': [
    { name: 'as usual' },
    { name: 'two readings', given: { readings: 2 } },
    { name: 'ten readings', given: { readings: 10 } },
    { name: 'a short run, badly timed', given: { time: 3600 }, halfWidths: { time: 1200 } },
    { name: 'next to nothing caught', given: { caught: 2e-6 } },
    { name: 'cup and time alike', given: { readings: 3 }, halfWidths: { time: 6000 } },
  ],
  'carry-over-by-weight': [
    { name: 'as usual' },
    { name: 'four readings on a coarse scale', given: { readings: 4 }, halfWidths: { weight: 0.002 } },
    { name: 'density alone', halfWidths: onlyOff('carry-over-by-weight', 'density', 60) },
  ],
  'orifice-flow': [
    { name: 'as usual' },
    { name: 'diameter alone, off by a fifth', halfWidths: onlyOff('orifice-flow', 'diameter', 0.0003) },
    { name: 'below the speed of sound', given: { upstreamPressure: 5 * psi }, halfWidths: { upstreamPressure: psi } },
    { name: 'where it begins to choke', given: { upstreamPressure: 13.1 * psi }, halfWidths: { upstreamPressure: 2 * psi } },
    { name: 'coefficient alone', halfWidths: onlyOff('orifice-flow', 'dischargeCoefficient', 0.1) },
  ],
};

describe.each(Object.entries(SCENARIOS))('the band of %s', (id, scenarios) => {
  it.each(scenarios)('holds 93 to 97 % of draws: $name', (scenario) => {
    const share = coverage(known(id), scenario, DRAWS, 20_261_202);
    expect(share).toBeGreaterThanOrEqual(0.93);
    expect(share).toBeLessThanOrEqual(0.97);
  });
});

describe('how far the bands of the sums are off', () => {
  // Few enough to be quick; their own noise is about half a percent.
  const few = 2000;

  it.each(SUMS.filter(({ inputs }) => inputs.some(({ halfWidth, byDefault }) => halfWidth(byDefault) > 0)))('$id is as the table says', (sum) => {
    const said = BAND_COVERAGE[sum.id];
    expect(Math.abs(coverage(sum, { name: 'as usual' }, few, 7) - (said?.usual ?? NaN))).toBeLessThan(0.015);
    expect(Math.abs(coverage(sum, tripled(sum), few, 7) - (said?.tripled ?? NaN))).toBeLessThan(0.02);
  }, 30_000);
});

describe('the distribution of a sum of uniform errors', () => {
  it('is that of the one error there is', () => {
    expect(sumOfUniforms([3], 0.95)).toBeCloseTo(2.85, 6);
    expect(sumOfUniforms([3, 0, 0], 0.95)).toBeCloseTo(2.85, 6);
    expect(sumOfUniforms([], 0.95)).toBe(0);
  });

  it('is a triangle for two alike: 2 (1 - sqrt(0.05))', () => {
    expect(sumOfUniforms([1, -1], 0.95)).toBeCloseTo(2 * (1 - Math.sqrt(0.05)), 4);
  });

  it('is the cubic of Irwin and Hall for three alike: 3 - (6 x 8 x 0.025)^(1/3)', () => {
    expect(sumOfUniforms([1, 1, 1], 0.95)).toBeCloseTo(3 - Math.cbrt(6 * 8 * 0.025), 3);
  });

  it('comes near the normal for many', () => {
    expect(sumOfUniforms(Array<number>(300).fill(1), 0.95) / (1.959964 * Math.sqrt(100))).toBeCloseTo(1, 2);
  });

  it('never passes all errors together, and grows with each', () => {
    const widths = fc.array(fc.double({ min: 0, max: 1e6, noNaN: true }), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(widths, fc.double({ min: 1e-3, max: 1e6, noNaN: true }), (some, more) => {
        const least = sumOfUniforms(some, 0.95);
        const all = some.reduce((sum, a) => sum + a, 0);
        expect(least).toBeLessThanOrEqual(all);
        expect(sumOfUniforms([...some, more], 0.95)).toBeGreaterThanOrEqual(least * (1 - 1e-3));
      }),
      { numRuns: 60 },
    );
  });
});

describe('a band', () => {
  it('is as wide as 95 % of the one error there is', () => {
    expect(band(({ v, t }) => v / t, { v: { value: 30, halfWidth: 1 }, t: { value: 20, halfWidth: 0 } })).toMatchObject({
      value: 1.5,
      low: expect.closeTo(1.4525, 6),
      high: expect.closeTo(1.5475, 6),
      shares: [
        { input: 'v', share: 1 },
        { input: 't', share: 0 },
      ],
    });
  });

  it('has no width where nothing can be off', () => {
    expect(band(({ v }) => 2 * v, { v: { value: 3, halfWidth: 0 } })).toEqual({ value: 6, low: 6, high: 6, shares: [{ input: 'v', share: 0 }] });
  });

  it('is open where "never" is within reach', () => {
    const filled = band(({ q }) => (q > 0 ? 1 / q : undefined), { q: { value: 1, halfWidth: 2 } });
    expect(filled).toMatchObject({ value: 1, high: undefined });
    expect(filled?.low).toBeLessThan(1);
  });

  it('is none where there is no value', () => {
    expect(band(() => undefined, { q: { value: 1, halfWidth: 2 } })).toBeUndefined();
  });

  it('ends where an input would leave its range', () => {
    const fromOne = (x: number) => {
      if (x < 1) throw new RangeError('x');
      return x;
    };
    const atTheEdge = band(({ x }) => fromOne(x), { x: { value: 1, halfWidth: 1 } });
    expect(atTheEdge).toMatchObject({ low: 1, high: expect.closeTo(1.95, 6) });
    expect(band(({ x }) => fromOne(x), { x: { value: 1.2, halfWidth: 1 } })?.low).toBeCloseTo(1, 9);
  });

  it('says which reading matters most', () => {
    const shares = band(({ a, b }) => a + b, { a: { value: 0, halfWidth: 1 }, b: { value: 0, halfWidth: 3 } })?.shares;
    expect(shares).toEqual([{ input: 'b', share: expect.closeTo(0.9, 9) }, { input: 'a', share: expect.closeTo(0.1, 9) }]);
  });
});
