import { gaugePressure, temperature, toAbsolute } from '@/lib/units';
import { FREE_AIR_TEMPERATURE, airDensity } from '../air';
import { frac, number, pow, sqrt, symbol, times } from '../formula/expression';
import { openingForFlow, orificeFlow as sum, type Opening } from '../orifice-flow';
import { requireWithin } from '../out-of-range';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, edge } from './inputs';
import { defineSum, input, output } from './sum';

export const AIR_CAUTIONS = [
  'Air under pressure drives dirt and oil into eyes and under skin. Wear eye and ear protection, and never point it at anybody or feel for a leak with a hand.',
];

const inputs = {
  upstreamPressure: input('Gauge pressure before the hole', 'p_up', 'pressure', 'psi', { byDefault: 100, least: 0.5, most: 400, off: 2 }),
  downstreamPressure: input('Gauge pressure behind the hole', 'p_down', 'pressure', 'psi', { optional: true, byDefault: 0, least: -5, most: 400, note: '0 where the air blows out into the open.' }),
  temperature: input('Air before the hole', 'T', 'temperature', 'degF', { optional: true, byDefault: 70, least: -60, most: 600, off: 9 }),
  dischargeCoefficient: edge,
  altitude,
};

/** What it takes in pressure for a flow to be told at all, Pa. */
const LEAST_DROP = 700;

function openingOf(given: { [K in keyof typeof inputs]: number }): Opening & { readonly freeAirDensityKgPerM3: number } {
  requireWithin('downstreamPressure', 'pressure', given.downstreamPressure, { most: given.upstreamPressure - LEAST_DROP });
  const atmosphere = standardAtmosphere(given.altitude);
  return {
    upstreamPressurePa: toAbsolute(gaugePressure(given.upstreamPressure), atmosphere),
    downstreamPressurePa: toAbsolute(gaugePressure(given.downstreamPressure), atmosphere),
    upstreamTemperatureK: temperature(given.temperature),
    dischargeCoefficient: given.dischargeCoefficient,
    freeAirDensityKgPerM3: airDensity(atmosphere, FREE_AIR_TEMPERATURE),
  };
}

/** m sqrt(T) / (C A p): 0.0404 where the flow chokes, less below. */
function flowFunction(opening: Opening): { flowFunction: number; choked: boolean } {
  const { massFlowKgPerS, choked } = sum({ ...opening, dischargeCoefficient: 1, diameterM: 1 });
  return { flowFunction: (massFlowKgPerS * Math.sqrt(opening.upstreamTemperatureK)) / ((Math.PI / 4) * opening.upstreamPressurePa), choked };
}

const terms = {
  upstreamAbsolute: output('Pressure before the hole, absolute', 'p_1', 'absolutePressure', 'psia'),
  flowFunction: output('Flow function of the pressures, s√K/m', 'ψ', 'ratio', 'one'),
  freeAirDensity: output('Density of free air', 'ρ_a', 'density', 'kg/m3'),
};

const CHOKED = 'The air leaves at the speed of sound: a lower pressure behind the hole changes nothing.';
const ASSUMPTIONS = ['The hole is round, and the air before it is at rest.', 'Flow is counted as free air: as it lies around the vehicle, at 20 °C (68 °F).'];

export const orificeFlow = defineSum({
  id: 'orifice-flow',
  name: 'Air through a hole',
  purpose: 'See how much air a hole of a known size lets through.',
  cautions: AIR_CAUTIONS,
  inputs: { diameter: input('Diameter of the hole', 'd', 'length', 'in', { byDefault: 0.0625, least: 0.004, most: 2, off: 0.002 }), ...inputs },
  outputs: { flow: output('Flow of free air', 'Q', 'flow', 'cfm') },
  main: 'flow',
  expression: frac(
    times(frac(number(Math.PI), number(4)), pow(symbol('diameter'), number(2)), symbol('dischargeCoefficient'), symbol('flowFunction'), symbol('upstreamAbsolute')),
    times(symbol('freeAirDensity'), sqrt(symbol('temperature'))),
  ),
  terms,
  assumptions: ASSUMPTIONS,
  cannotTell: ['The flow of a crack or a seat: their coefficient can be half of a round hole’s.'],
  source: 'Isentropic flow through a nozzle with a discharge coefficient; agrees with handbook tables of air through an orifice.',
  compute: (given) => {
    const opening = openingOf(given);
    const { flowFunction: psi, choked } = flowFunction(opening);
    const { freeAirFlowM3PerS } = sum({ ...opening, diameterM: given.diameter });
    return { values: { flow: freeAirFlowM3PerS, upstreamAbsolute: opening.upstreamPressurePa, flowFunction: psi, freeAirDensity: opening.freeAirDensityKgPerM3 }, notes: choked ? [CHOKED] : [] };
  },
});

export const leakSize = defineSum({
  id: 'leak-size',
  name: 'Size of a leak',
  purpose: 'Turn a leak that you measured into the size of a round hole, so that you know what to look for.',
  cautions: AIR_CAUTIONS,
  inputs: { flow: input('Leak, free air', 'Q', 'flow', 'cfm', { byDefault: 1, least: 0.001, most: 200, share: 0.1 }), ...inputs },
  outputs: { diameter: output('Diameter of one round hole', 'd', 'length', 'in') },
  main: 'diameter',
  expression: sqrt(
    frac(
      times(number(4), symbol('flow'), symbol('freeAirDensity'), sqrt(symbol('temperature'))),
      times(number(Math.PI), symbol('dischargeCoefficient'), symbol('flowFunction'), symbol('upstreamAbsolute')),
    ),
  ),
  terms,
  assumptions: ASSUMPTIONS,
  cannotTell: ['Whether it is one leak or many: ten small ones lose as much as one of three times their diameter.'],
  source: 'Isentropic flow through a nozzle with a discharge coefficient.',
  compute: (given) => {
    const opening = openingOf(given);
    return {
      values: {
        diameter: openingForFlow({ ...opening, freeAirFlowM3PerS: given.flow }),
        upstreamAbsolute: opening.upstreamPressurePa,
        flowFunction: flowFunction(opening).flowFunction,
        freeAirDensity: opening.freeAirDensityKgPerM3,
      },
    };
  },
});
