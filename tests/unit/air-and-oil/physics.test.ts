import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airViscosity } from '@/lib/air-and-oil/air-viscosity';
import { breakInBleed } from '@/lib/air-and-oil/break-in-bleed';
import { buildUpTime, freeAirDelivery, leastDelivery } from '@/lib/air-and-oil/build-up';
import { oilPerLoadedTime, oilPerTime, oilVolume, requireReadings } from '@/lib/air-and-oil/carry-over';
import { clearanceWithoutDelivery, volumetricEfficiency } from '@/lib/air-and-oil/delivery';
import { dischargeTemperature } from '@/lib/air-and-oil/discharge-temperature';
import { drainCapacity, laminarGravityFlow, orificeGravityFlow } from '@/lib/air-and-oil/drain';
import { frictionFactor } from '@/lib/air-and-oil/friction-factor';
import { harrisLoss, harrisLossRatio } from '@/lib/air-and-oil/harris-loss';
import { correctedEndPressure, dutyOfLeak, fallingPressureFactor, halvingLeak, leakDown, pressureAfterCooling } from '@/lib/air-and-oil/leak-down';
import { darcyWeisbachLoss, massFlowOf, upstreamPressure } from '@/lib/air-and-oil/line-friction';
import { oilViscosity, viscosityLine } from '@/lib/air-and-oil/oil-viscosity';
import { criticalPressureRatio, openingForFlow, orificeFlow } from '@/lib/air-and-oil/orifice-flow';
import { OutOfRange } from '@/lib/air-and-oil/out-of-range';
import { polytropicIndex } from '@/lib/air-and-oil/polytropic-index';
import { realDischargeTemperature } from '@/lib/air-and-oil/real-discharge-temperature';
import { standardAtmosphere } from '@/lib/air-and-oil/standard-atmosphere';
import { absolutePressure, fromSi, gaugePressure, temperature, toAbsolute, toSi } from '@/lib/units';

const psi = (value: number) => gaugePressure(toSi(value, 'pressure', 'psi'));
const cfm = (value: number) => toSi(value, 'flow', 'cfm');
const fahrenheit = (value: number) => temperature(toSi(value, 'temperature', 'degF'));
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const INTAKE = { inletTemperatureK: temperature(294), inletPressurePa: absolutePressure(101_325) };

describe('compression', () => {
  it('gives back the index that made a temperature', () => {
    fc.assert(
      fc.property(between(1.01, 1.6), between(20, 200), (index, pressure) => {
        const compression = { ...INTAKE, dischargePressurePa: toAbsolute(psi(pressure)) };
        const dischargeTemperatureK = dischargeTemperature({ ...compression, index });
        expect(polytropicIndex({ ...compression, dischargeTemperatureK })).toBeCloseTo(index, 9);
      }),
    );
  });

  it('is hotter for more pressure and a higher index, and as cold as the intake without either', () => {
    fc.assert(
      fc.property(between(1, 1.6), between(0, 200), between(0, 50), (index, pressure, more) => {
        const at = (p: number, n: number) => dischargeTemperature({ ...INTAKE, dischargePressurePa: toAbsolute(psi(p)), index: n });
        expect(at(pressure + more, index)).toBeGreaterThanOrEqual(at(pressure, index));
        expect(at(pressure, Math.min(2, index + 0.1))).toBeGreaterThanOrEqual(at(pressure, index));
        expect(at(0, index)).toBe(294);
      }),
    );
  });

  it('heats real air less than a perfect gas, and not at all without pressure', () => {
    fc.assert(
      fc.property(between(1, 250), (pressure) => {
        const compression = { ...INTAKE, dischargePressurePa: toAbsolute(psi(pressure)) };
        expect(realDischargeTemperature(compression)).toBeLessThan(dischargeTemperature({ ...compression, index: 1.4 }) + 0.3);
      }),
    );
    expect(realDischargeTemperature({ ...INTAKE, dischargePressurePa: INTAKE.inletPressurePa })).toBeCloseTo(294, 9);
  });

  it('has no index where heat is more than one compression gives', () => {
    expect(() => polytropicIndex({ ...INTAKE, dischargePressurePa: toAbsolute(psi(2)), dischargeTemperatureK: temperature(600) })).toThrow(OutOfRange);
  });
});

describe('lines', () => {
  it.each([[250, 15.96], [300, 18.46], [400, 23.01], [600, 30.58]])('carry air as thick as at %d K in printed tables, within 2 %% (from memory)', (kelvin, micropascalSeconds) => {
    expect(Math.abs((airViscosity(temperature(kelvin)) * 1e6) / micropascalSeconds - 1)).toBeLessThan(0.02);
  });

  const air = { massFlowKgPerS: massFlowOf(cfm(12)), airTemperatureK: temperature(400) };

  it('take 64 / Re where they run in layers, and by Colebrook and White within 2 % where they don’t', () => {
    expect(frictionFactor({ reynolds: 500 }) / (64 / 500)).toBeCloseTo(1, 3);
    for (const [reynolds, relativeRoughness] of [[1e4, 0], [4e4, 1e-4], [1e5, 1e-3], [1e6, 1e-4]] as const) {
      let f = 0.02;
      for (let i = 0; i < 50; i += 1) f = (-2 * Math.log10(relativeRoughness / 3.7 + 2.51 / (reynolds * Math.sqrt(f)))) ** -2;
      expect(Math.abs(frictionFactor({ reynolds, relativeRoughness }) / f - 1)).toBeLessThan(0.02);
    }
  });

  it('take more the less bore is left', () => {
    fc.assert(
      fc.property(between(0.001, 0.03), between(0.5, 0.999), (boreM, share) => {
        const linePressurePa = toAbsolute(psi(120));
        const darcy = (bore: number) => darcyWeisbachLoss({ lengthM: 3, boreM: bore, ...air, linePressurePa });
        const harris = (bore: number) => harrisLoss({ lengthM: 3, boreM: bore, freeAirFlowM3PerS: cfm(12), linePressurePa });
        expect(darcy(boreM * share)).toBeGreaterThan(darcy(boreM));
        expect(harris(boreM * share) / harris(boreM)).toBeCloseTo(harrisLossRatio({ nominalBoreM: boreM, boreM: boreM * share }), 6);
      }),
    );
  });

  it('with a small loss take alike by one density and by the density between both ends', () => {
    const downstreamPressurePa = toAbsolute(psi(120));
    const upstream = upstreamPressure({ lengthM: 3, boreM: 0.0127, ...air, downstreamPressurePa });
    const loss = darcyWeisbachLoss({ lengthM: 3, boreM: 0.0127, ...air, linePressurePa: absolutePressure((upstream + downstreamPressurePa) / 2) });
    expect((upstream - downstreamPressurePa) / loss).toBeCloseTo(1, 9);
  });

  it('take nothing where they have no length or nothing flows', () => {
    const linePressurePa = toAbsolute(psi(120));
    expect(darcyWeisbachLoss({ lengthM: 0, boreM: 0.01, ...air, linePressurePa })).toBe(0);
    expect(darcyWeisbachLoss({ lengthM: 3, boreM: 0.01, ...air, massFlowKgPerS: 0, linePressurePa })).toBe(0);
  });
});

describe('a hole', () => {
  const opening = { upstreamTemperatureK: temperature(294), downstreamPressurePa: absolutePressure(101_325) };

  it('is as large as the flow that it was worked out for', () => {
    fc.assert(
      fc.property(between(0.01, 50), between(0.5, 200), (flow, pressure) => {
        const upstreamPressurePa = toAbsolute(psi(pressure));
        const diameterM = openingForFlow({ ...opening, freeAirFlowM3PerS: cfm(flow), upstreamPressurePa });
        expect(orificeFlow({ ...opening, diameterM, upstreamPressurePa }).freeAirFlowM3PerS / cfm(flow)).toBeCloseTo(1, 9);
      }),
    );
  });

  it('passes more with more pressure, without a step where it begins to choke', () => {
    const at = (upstreamPressurePa: number) => orificeFlow({ ...opening, diameterM: 0.002, upstreamPressurePa: absolutePressure(upstreamPressurePa) });
    const chokes = 101_325 / criticalPressureRatio();
    expect(at(chokes * (1 - 1e-7)).choked).toBe(false);
    expect(at(chokes * (1 + 1e-7)).choked).toBe(true);
    expect(at(chokes * (1 - 1e-7)).massFlowKgPerS / at(chokes * (1 + 1e-7)).massFlowKgPerS).toBeCloseTo(1, 6);
    fc.assert(
      fc.property(between(101_325, 1e6), between(1, 1e5), (p, more) => {
        expect(at(p + more).massFlowKgPerS).toBeGreaterThan(at(p).massFlowKgPerS);
      }),
    );
  });

  it('passes nothing between equal pressures, and no size is found for a flow there', () => {
    const upstreamPressurePa = opening.downstreamPressurePa;
    expect(orificeFlow({ ...opening, diameterM: 0.002, upstreamPressurePa }).massFlowKgPerS).toBe(0);
    expect(() => openingForFlow({ ...opening, freeAirFlowM3PerS: 0.001, upstreamPressurePa })).toThrow(OutOfRange);
  });

  it('for a break-in passes just what the compressor delivers', () => {
    const run = { sweptVolumeM3: 0.00027, speedHz: 1000 / 60, clearance: 0.05, otherLosses: 0.1, index: 1.3, ...INTAKE, holdPressurePa: toAbsolute(psi(80)), tankTemperatureK: temperature(320) };
    const { diameterM, freeAirFlowM3PerS } = breakInBleed(run);
    const passed = orificeFlow({ diameterM, upstreamPressurePa: run.holdPressurePa, downstreamPressurePa: run.inletPressurePa, upstreamTemperatureK: run.tankTemperatureK });
    expect(passed.freeAirFlowM3PerS / freeAirFlowM3PerS).toBeCloseTo(1, 9);
    expect(diameterM).toBeGreaterThan(0.0015);
    expect(diameterM).toBeLessThan(0.004);
  });
});

describe('a tank', () => {
  const rise = { volumeM3: 0.085, fromPressurePa: psi(85), toPressurePa: psi(100) };

  it('fills by the full delivery without a leak, later with more of one, and never with as much', () => {
    fc.assert(
      fc.property(between(1, 30), between(0, 0.99), between(0, 0.009), (delivery, share, more) => {
        const time = (leak: number) => {
          const arrival = buildUpTime({ ...rise, deliveryM3PerS: cfm(delivery), leakM3PerS: cfm(delivery * leak) });
          return arrival.kind === 'after' ? arrival.timeS : NaN;
        };
        expect(time(share + more)).toBeGreaterThanOrEqual(time(share));
        expect(cfm(delivery) / leastDelivery({ ...rise, timeS: time(0) })).toBeCloseTo(1, 9);
      }),
    );
    for (const leak of [12, 13]) expect(buildUpTime({ ...rise, deliveryM3PerS: cfm(12), leakM3PerS: cfm(leak) })).toEqual({ kind: 'never' });
    expect(buildUpTime({ ...rise, deliveryM3PerS: 0, leakM3PerS: 0 })).toEqual({ kind: 'never' });
  });

  it('shows less delivery the hotter it was filled', () => {
    const filled = (tank: number) => freeAirDelivery({ ...rise, timeS: 20, airTemperatureK: fahrenheit(70), tankTemperatureK: fahrenheit(tank) });
    expect(filled(120)).toBeLessThan(filled(70));
  });

  it('that only cools has no leak, though its gauge falls more than the limits', () => {
    fc.assert(
      fc.property(between(250, 350), between(-30, 30), (start, warmer) => {
        const [startTemperatureK, endTemperatureK] = [temperature(start), temperature(start + warmer)];
        const end = pressureAfterCooling({ startPressurePa: toAbsolute(psi(120)), startTemperatureK, endTemperatureK });
        const endPressurePa = gaugePressure(end - 101_325);
        const { meanLeakM3PerS } = leakDown({ volumeM3: 0.085, startPressurePa: psi(120), endPressurePa, timeS: 60, startTemperatureK, endTemperatureK });
        expect(Math.abs(meanLeakM3PerS)).toBeLessThan(1e-12);
        expect(correctedEndPressure({ endPressurePa: end, startTemperatureK, endTemperatureK }) / toAbsolute(psi(120))).toBeCloseTo(1, 12);
      }),
    );
    const fall = 120 - fromSi(pressureAfterCooling({ startPressurePa: toAbsolute(psi(120)), startTemperatureK: fahrenheit(120), endTemperatureK: fahrenheit(100) }) - 101_325, 'pressure', 'psi');
    expect(fall).toBeCloseTo(4.6, 1);
  });

  it('that leaks through a hole falls as e^(-t/tau), whatever the length of the test', () => {
    const tau = 900;
    const start = toAbsolute(psi(120));
    for (const timeS of [1, 60, 600, 3600]) {
      const endPressurePa = gaugePressure(start * Math.exp(-timeS / tau) - 101_325);
      const { leakAtStartM3PerS } = leakDown({ volumeM3: 0.085, startPressurePa: psi(120), endPressurePa, timeS, startTemperatureK: temperature(294), endTemperatureK: temperature(294) });
      expect(leakAtStartM3PerS / ((0.085 * start) / (tau * 101_325))).toBeCloseTo(1, 9);
    }
  });

  it('is never judged by the factor of a halving pressure on a short test', () => {
    expect(() => halvingLeak({ volumeM3: 0.085, startPressurePa: psi(120), endPressurePa: psi(118), timeS: 60 })).toThrow(OutOfRange);
    expect(fallingPressureFactor({ startPressurePa: toAbsolute(psi(120)), endPressurePa: toAbsolute(psi(118)) })).toBeLessThan(1.01);
    expect(fallingPressureFactor({ startPressurePa: toAbsolute(psi(120)), endPressurePa: toAbsolute(psi(120)) })).toBe(1);
  });

  it('that loses all that is delivered never lets the compressor unload', () => {
    expect(dutyOfLeak({ leakM3PerS: 1, deliveryM3PerS: 1 })).toEqual({ kind: 'never unloads' });
    expect(dutyOfLeak({ leakM3PerS: 0, deliveryM3PerS: 1 })).toEqual({ kind: 'share', share: 0 });
  });
});

describe('delivery', () => {
  const against = (pressure: number) => ({ inletPressurePa: absolutePressure(101_325), dischargePressurePa: toAbsolute(psi(pressure)), index: 1.3 });

  it('is whole without clearance, less with more pressure, and none at the clearance that is found for it', () => {
    fc.assert(
      fc.property(between(1, 250), between(0, 0.3), (pressure, clearance) => {
        expect(volumetricEfficiency({ ...against(pressure), clearance: 0 })).toBe(1);
        expect(volumetricEfficiency({ ...against(pressure + 10), clearance })).toBeLessThanOrEqual(volumetricEfficiency({ ...against(pressure), clearance }));
        const most = clearanceWithoutDelivery(against(pressure));
        if (most <= 1) expect(volumetricEfficiency({ ...against(pressure), clearance: most })).toBeCloseTo(0, 9);
      }),
    );
  });

  it('is thinner high up: 83.4 kPa a mile above the sea (U.S. Standard Atmosphere 1976: 83.44)', () => {
    expect(standardAtmosphere(1609.344)).toBeCloseTo(83_437, -2);
    expect(standardAtmosphere(0)).toBe(101_325);
  });
});

describe('oil', () => {
  const sheet = viscosityLine({ temperatureK: temperature(313.15), viscosityM2PerS: 110e-6 }, { temperatureK: temperature(373.15), viscosityM2PerS: 14.8e-6 });

  it('is as thick as its data sheet says, and thinner the hotter', () => {
    expect(oilViscosity(sheet, temperature(313.15)) * 1e6).toBeCloseTo(110, 9);
    expect(oilViscosity(sheet, temperature(373.15)) * 1e6).toBeCloseTo(14.8, 9);
    fc.assert(
      fc.property(between(250, 440), between(0.1, 20), (t, more) => {
        expect(oilViscosity(sheet, temperature(t + more))).toBeLessThan(oilViscosity(sheet, temperature(t)));
      }),
    );
  });

  it('needs two temperatures', () => {
    const point = { temperatureK: temperature(313.15), viscosityM2PerS: 110e-6 };
    expect(() => viscosityLine(point, point)).toThrow(OutOfRange);
  });

  it('drains as in layers where it is thick, as from a hole where it is thin, and never faster than either', () => {
    const drain = { boreM: 0.008, lengthM: 0.05, heightM: 0.05 };
    const thick = drainCapacity({ ...drain, viscosityM2PerS: 0.05 });
    expect(thick.flowM3PerS / laminarGravityFlow({ boreM: 0.008, slopeRad: Math.PI / 2, viscosityM2PerS: 0.05 }).flowM3PerS).toBeCloseTo(1, 2);
    expect(thick.mostlyDrag).toBe(true);
    const thin = drainCapacity({ ...drain, lengthM: 0, viscosityM2PerS: 1e-6 });
    expect(thin.flowM3PerS / orificeGravityFlow({ ...drain, dischargeCoefficient: 0.6 })).toBeCloseTo(1, 9);
    expect(drainCapacity({ ...drain, heightM: 0, lengthM: 0, viscosityM2PerS: 1e-6 }).flowM3PerS).toBe(0);
    fc.assert(
      fc.property(between(0.001, 0.03), between(0.001, 0.5), between(2e-6, 1e-3), between(1, 2), (boreM, heightM, viscosityM2PerS, larger) => {
        const flow = drainCapacity({ boreM, lengthM: heightM, heightM, viscosityM2PerS }).flowM3PerS;
        expect(flow).toBeLessThanOrEqual(orificeGravityFlow({ boreM, heightM, dischargeCoefficient: 0.6 }) * (1 + 1e-9));
        expect(flow).toBeLessThanOrEqual(laminarGravityFlow({ boreM, slopeRad: Math.PI / 2, viscosityM2PerS }).flowM3PerS * (1 + 1e-9));
        expect(drainCapacity({ boreM: boreM * larger, lengthM: heightM, heightM, viscosityM2PerS }).flowM3PerS).toBeGreaterThanOrEqual(flow);
      }),
    );
  });

  it('is caught by the hour, by the loaded hour and by weight', () => {
    expect(oilPerTime({ caughtM3: 30e-6, timeS: 72_000 }) * 3.6e9).toBeCloseTo(1.5, 9);
    expect(oilPerLoadedTime({ caughtM3: 30e-6, timeS: 72_000, shareLoaded: 0.25 }) * 3.6e9).toBeCloseTo(6, 9);
    expect(oilVolume({ massKg: 0.0261, oilDensityKgPerM3: 870 })).toBeCloseTo(30e-6, 12);
    for (const readings of [0, 1.5, -1, NaN]) expect(() => requireReadings(readings)).toThrow(OutOfRange);
  });
});
