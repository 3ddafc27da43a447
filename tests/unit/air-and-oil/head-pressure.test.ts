import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { MOST_HEAD_PRESSURE, boreForHeadPressure, headPressure, headTemperature, pressureNeeded, type Delivery, type RestrictedLine } from '@/lib/air-and-oil/head-pressure';
import { upstreamPressure, massFlowOf } from '@/lib/air-and-oil/line-friction';
import { absolutePressure, gaugePressure, temperature, toAbsolute, toGauge, toSi } from '@/lib/units';

const psi = (value: number) => gaugePressure(toSi(value, 'pressure', 'psi'));
const inch = 0.0254;

const LINE: RestrictedLine = { lengthM: 3.6, nominalBoreM: 0.625 * inch, narrowedLengthM: 1.8, narrowedBoreM: 0.1875 * inch };
const DELIVERY: Delivery = {
  freeAirFlowM3PerS: toSi(12, 'flow', 'cfm'),
  inletTemperatureK: temperature(294),
  inletPressurePa: absolutePressure(101_325),
  index: 1.3,
  systemPressurePa: toAbsolute(psi(120)),
};

/** The same equations by the slowest way there is, which cannot go wrong. */
function byBisection(line: RestrictedLine, delivery: Delivery): number {
  const needed = (p: number) => pressureNeeded(headTemperature(absolutePressure(p), delivery), line, delivery).pressurePa;
  let [low, high] = [delivery.systemPressurePa as number, MOST_HEAD_PRESSURE as number];
  for (let i = 0; i < 200; i += 1) {
    const middle = (low + high) / 2;
    if (needed(middle) > middle) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const settled = (line: RestrictedLine, delivery: Delivery): number => {
  const head = headPressure(line, delivery);
  return head.kind === 'settled' ? head.headPressurePa : Infinity;
};

const anyCase = fc
  .record({
    lengthM: fc.double({ min: 0.1, max: 15, noNaN: true }),
    nominalBoreM: fc.double({ min: 0.004, max: 0.04, noNaN: true }),
    narrowedShare: fc.double({ min: 0, max: 1, noNaN: true }),
    boreShare: fc.double({ min: 0.03, max: 1, noNaN: true }),
    cfm: fc.double({ min: 0.01, max: 60, noNaN: true }),
    system: fc.double({ min: 0, max: 200, noNaN: true }),
    index: fc.double({ min: 1, max: 1.6, noNaN: true }),
    inlet: fc.double({ min: 230, max: 390, noNaN: true }),
  })
  .map(({ lengthM, nominalBoreM, narrowedShare, boreShare, cfm, system, index, inlet }) => ({
    line: { lengthM, nominalBoreM, narrowedLengthM: lengthM * narrowedShare, narrowedBoreM: nominalBoreM * boreShare },
    delivery: { ...DELIVERY, freeAirFlowM3PerS: toSi(cfm, 'flow', 'cfm'), systemPressurePa: toAbsolute(psi(system)), index, inletTemperatureK: temperature(inlet) },
  }));

describe('the pressure at the head', () => {
  it('is what bisection finds, over the whole range', () => {
    fc.assert(
      fc.property(anyCase, ({ line, delivery }) => {
        const head = headPressure(line, delivery);
        expect(head.kind).not.toBe('not-settled');
        if (head.kind === 'settled') expect(Math.abs(head.headPressurePa / byBisection(line, delivery) - 1)).toBeLessThan(1e-9);
        else expect(byBisection(line, delivery)).toBeCloseTo(MOST_HEAD_PRESSURE, 0);
      }),
      { numRuns: 400 },
    );
  });

  it('rises as the bore is lost, and as more is delivered', () => {
    fc.assert(
      fc.property(anyCase, fc.double({ min: 0.5, max: 0.999, noNaN: true }), ({ line, delivery }, less) => {
        const here = settled(line, delivery);
        expect(settled({ ...line, narrowedBoreM: line.narrowedBoreM * less }, delivery)).toBeGreaterThanOrEqual(here * (1 - 1e-12));
        expect(settled(line, { ...delivery, freeAirFlowM3PerS: delivery.freeAirFlowM3PerS * less })).toBeLessThanOrEqual(here * (1 + 1e-12));
      }),
      { numRuns: 200 },
    );
  });

  it('is that of the new line with the full bore, however much of it is called narrowed', () => {
    const full = { ...LINE, narrowedBoreM: LINE.nominalBoreM };
    const head = headPressure(full, DELIVERY);
    if (head.kind !== 'settled') throw new Error(head.kind);
    const whole = upstreamPressure({
      lengthM: LINE.lengthM,
      boreM: LINE.nominalBoreM,
      massFlowKgPerS: massFlowOf(DELIVERY.freeAirFlowM3PerS),
      airTemperatureK: head.headTemperatureK,
      downstreamPressurePa: DELIVERY.systemPressurePa,
    });
    expect(head.headPressurePa / whole).toBeCloseTo(1, 9);
    expect(settled({ ...full, narrowedLengthM: 0 }, DELIVERY) / head.headPressurePa).toBeCloseTo(1, 9);
  });

  it('is that of the system when next to nothing flows', () => {
    const still = headPressure(LINE, { ...DELIVERY, freeAirFlowM3PerS: 0 });
    expect(still).toMatchObject({ kind: 'settled', lossPa: 0, choked: false });
  });

  it('shows why a line that passes air freely at low flow still raises the head at delivery', () => {
    const trickle = settled({ ...LINE, narrowedBoreM: 0.003 }, { ...DELIVERY, freeAirFlowM3PerS: toSi(0.5, 'flow', 'cfm'), systemPressurePa: toAbsolute(psi(0)) });
    const delivering = settled({ ...LINE, narrowedBoreM: 0.003 }, DELIVERY);
    expect(toGauge(absolutePressure(trickle))).toBeLessThan(psi(5));
    expect(toGauge(absolutePressure(delivering))).toBeGreaterThan(psi(200));
  });

  it('says so when the line is as good as blocked', () => {
    expect(headPressure({ ...LINE, narrowedBoreM: 0.0005 }, DELIVERY)).toEqual({ kind: 'beyond' });
  });

  it('is limited by the speed of sound through a short, tight opening', () => {
    expect(headPressure({ ...LINE, narrowedLengthM: 0.001, narrowedBoreM: 0.0018 }, DELIVERY)).toMatchObject({ kind: 'settled', choked: true });
  });
});

describe('the bore at which the head comes to a pressure', () => {
  it.each([150, 250])('brings it to %d psi', (limit) => {
    const found = boreForHeadPressure(LINE, DELIVERY, toAbsolute(psi(limit)));
    if (found.kind !== 'bore') throw new Error(found.kind);
    expect(settled({ ...LINE, narrowedBoreM: found.boreM }, DELIVERY) / toAbsolute(psi(limit))).toBeCloseTo(1, 9);
  });

  it('holds wherever there is one', () => {
    fc.assert(
      fc.property(anyCase, ({ line, delivery }) => {
        const limit = absolutePressure(delivery.systemPressurePa * 1.5);
        const found = boreForHeadPressure(line, delivery, limit);
        expect(found.kind).not.toBe('not-settled');
        if (found.kind === 'bore') expect(Math.abs(settled({ ...line, narrowedBoreM: found.boreM }, delivery) / limit - 1)).toBeLessThan(1e-9);
      }),
      { numRuns: 200 },
    );
  });

  it('says when even the full bore is too small, and when nothing flows', () => {
    expect(boreForHeadPressure({ ...LINE, nominalBoreM: 0.002 }, DELIVERY, toAbsolute(psi(150)))).toEqual({ kind: 'always-above' });
    expect(boreForHeadPressure(LINE, { ...DELIVERY, freeAirFlowM3PerS: 0 }, toAbsolute(psi(150)))).toEqual({ kind: 'never' });
  });
});
