import fc from 'fast-check';
import { describe, expect, expectTypeOf, it } from 'vitest';
import {
  QUANTITY_IDS,
  absolutePressure,
  fromSi,
  gaugePressure,
  hotterBy,
  temperature,
  temperatureDifference,
  toAbsolute,
  toGauge,
  toSi,
  unitDefinition,
  unitsOf,
  warmed,
  type AbsolutePressure,
  type GaugePressure,
  type Quantity,
  type Temperature,
  type TemperatureDifference,
  type UnitId,
} from '@/lib/units';

describe('gauge and absolute', () => {
  it('are a standard atmosphere apart, unless the air around is thinner', () => {
    expect(toAbsolute(gaugePressure(0))).toBe(101_325);
    expect(toAbsolute(gaugePressure(-101_325))).toBe(0);
    expect(toGauge(absolutePressure(83_437), absolutePressure(83_437))).toBe(0);
  });

  it('give each other back', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e5, max: 2e6, noNaN: true }), fc.double({ min: 5e4, max: 1.1e5, noNaN: true }), (pa, atmosphere) => {
        const around = absolutePressure(atmosphere);
        expect(Math.abs(toGauge(toAbsolute(gaugePressure(pa), around), around) - pa)).toBeLessThan(1e-9);
      }),
    );
  });

  it('are different things to the compiler, as are a temperature and a difference', () => {
    expectTypeOf<GaugePressure>().not.toExtend<AbsolutePressure>();
    expectTypeOf<number>().not.toExtend<GaugePressure>();
    expectTypeOf<Temperature>().not.toExtend<TemperatureDifference>();
    // @ts-expect-error a gauge pressure is no absolute one
    expect(toGauge(gaugePressure(101_325))).toBe(0);
  });
});

describe('temperatures', () => {
  it('differ by a difference, and are warmed by one', () => {
    expect(hotterBy(temperature(373.15), temperature(293.15))).toBeCloseTo(80, 12);
    expect(warmed(temperature(293.15), temperatureDifference(-20))).toBeCloseTo(273.15, 12);
  });
});

describe('units', () => {
  it('come back from SI to 1e-12 of their size, in every unit of every quantity', () => {
    for (const quantity of QUANTITY_IDS) {
      for (const unit of unitsOf(quantity)) {
        // The scales of temperature share their zero only at absolute zero, so that sizes count from there.
        const { factor } = unitDefinition<Quantity>(quantity, unit);
        fc.assert(
          fc.property(fc.double({ min: 1, max: 1e6, noNaN: true }), (size) => {
            const si = size * factor;
            expect(Math.abs(toSi<Quantity>(fromSi<Quantity>(si, quantity, unit), quantity, unit) / si - 1)).toBeLessThan(1e-12);
          }),
          { numRuns: 25 },
        );
      }
    }
  });

  it.each<[Quantity, UnitId, number]>([
    // Printed factors of NIST Special Publication 811 (2008), appendix B.8; from memory.
    ['absolutePressure', 'psia', 6.894757e3],
    ['absolutePressure', 'atm', 1.01325e5],
    ['absolutePressure', 'inHg abs', 3.386389e3],
    ['kinematicViscosity', 'cSt', 1e-6],
    ['dynamicViscosity', 'cP', 1e-3],
    ['density', 'lb/ft3', 1.601846e1],
    ['density', 'lb/gal', 1.198264e2],
    ['power', 'hp', 7.456999e2],
    ['power', 'PS', 7.354988e2],
    ['angle', 'deg', 1.745329e-2],
  ])('%s in %s agree with NIST SP 811, from memory', (quantity, unit, printed) => {
    expect(Math.abs(toSi(1, quantity, unit) / printed - 1)).toBeLessThan(5e-7);
  });
});
