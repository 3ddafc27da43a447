import { gaugePressure, temperature, toAbsolute } from '@/lib/units';
import { FREE_AIR_TEMPERATURE, airDensity } from '../air';
import { breakInBleed as sum } from '../break-in-bleed';
import { frac, number, sqrt, symbol, times } from '../formula/expression';
import { criticalFlowConstant } from '../orifice-flow';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, clearance, driveRatio, edge, index, inletTemperature, otherLosses } from './inputs';
import { defineSum, input, output } from './sum';

export const breakInBleed = defineSum({
  id: 'break-in-bleed',
  name: 'Bleed for the break-in run',
  purpose: 'Find the opening at the wet tank that holds about 80 psi at 1,000 rpm, so that a fitted compressor does not unload while it runs in.',
  cautions: [
    'Chock the wheels on level ground: springs brake and suspension drops as pressure falls. Run outdoors or with extraction; keep clear of belts, fan and hot parts.',
    'The bleed throws oil mist and is loud: protect eyes and ears, and point it away from people and flames.',
  ],
  inputs: {
    displacement: input('Displacement of the compressor', 'V_s', 'displacement', 'in3', { byDefault: 16.5, least: 2, most: 150, share: 0.01 }),
    engineSpeed: input('Engine speed', 'N', 'rotationalSpeed', 'rpm', { optional: true, byDefault: 1000, least: 300, most: 3000, off: 25 }),
    driveRatio,
    holdPressure: input('Gauge pressure to hold', 'p', 'pressure', 'psi', { optional: true, byDefault: 80, least: 20, most: 120, off: 2 }),
    clearance,
    otherLosses,
    index: index(1.3),
    inletTemperature,
    tankTemperature: input('Air in the wet tank', 'T', 'temperature', 'degF', { optional: true, byDefault: 120, least: -40, most: 400, off: 15 }),
    dischargeCoefficient: edge,
    altitude,
  },
  outputs: {
    diameter: output('Diameter of the opening', 'd', 'length', 'in'),
    flow: output('Free air that it passes', 'Q', 'flow', 'cfm'),
  },
  main: 'diameter',
  expression: sqrt(
    frac(
      times(number(4), symbol('flow'), symbol('freeAirDensity'), sqrt(symbol('tankTemperature'))),
      times(number(Math.PI), symbol('dischargeCoefficient'), number(criticalFlowConstant()), symbol('holdAbsolute')),
    ),
  ),
  terms: {
    holdAbsolute: output('Pressure to hold, absolute', 'p_1', 'absolutePressure', 'psia'),
    freeAirDensity: output('Density of free air', 'ρ_a', 'density', 'kg/m3'),
  },
  assumptions: ['All that is delivered leaves through the opening, and nothing else leaks.', 'The opening is round and blows into the open; a drain cock needs to be opened until the gauge stands.'],
  cannotTell: ['What a worn or badly sealed compressor delivers: watch the gauge and set the opening by it.'],
  source: 'Delivery by volumetric efficiency (E. G. Harris, Compressed Air, formula 11) through a choked opening.',
  compute: (given) => {
    const atmosphere = standardAtmosphere(given.altitude);
    const holdPressurePa = toAbsolute(gaugePressure(given.holdPressure), atmosphere);
    const { diameterM, freeAirFlowM3PerS } = sum({
      sweptVolumeM3: given.displacement,
      speedHz: given.engineSpeed * given.driveRatio,
      clearance: given.clearance,
      otherLosses: given.otherLosses,
      index: given.index,
      inletTemperatureK: temperature(given.inletTemperature),
      inletPressurePa: atmosphere,
      holdPressurePa,
      tankTemperatureK: temperature(given.tankTemperature),
      dischargeCoefficient: given.dischargeCoefficient,
    });
    // From 20 psi up the opening chokes at any altitude that is allowed, as the formula shown says.
    return { values: { diameter: diameterM, flow: freeAirFlowM3PerS, holdAbsolute: holdPressurePa, freeAirDensity: airDensity(atmosphere, FREE_AIR_TEMPERATURE) } };
  },
});
