import { gaugePressure, temperature, toAbsolute, toGauge, toSi } from '@/lib/units';
import { FREE_AIR_TEMPERATURE, GAS_CONSTANT_AIR, HEAT_CAPACITY_RATIO, airDensity } from '../air';
import { frac, larger, minus, number, plus, pow, sqrt, symbol, times } from '../formula/expression';
import { ENTRY_COEFFICIENT, boreForHeadPressure, headPressure as solve, type Delivery } from '../head-pressure';
import { massFlowOf, massFlux, upstreamPressure } from '../line-friction';
import { criticalFlowConstant } from '../orifice-flow';
import { requireWithin } from '../out-of-range';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, deliveryFlow, index, inletTemperature } from './inputs';
import { LINE_CAUTIONS, SMOOTH_WALL, lineInputs } from './line';
import { defineSum, input, output } from './sum';

const LIMIT_1 = gaugePressure(toSi(150, 'pressure', 'psi'));
const LIMIT_2 = gaugePressure(toSi(250, 'pressure', 'psi'));

const PULSES = 'A piston sends its air in pulses: steady flow, as here, understates the peaks at the head.';

const sonicExit = times(symbol('flux'), sqrt(frac(times(number(GAS_CONSTANT_AIR), symbol('headTemperature')), number(HEAT_CAPACITY_RATIO))));
const friction = frac(
  times(symbol('factor'), symbol('narrowedLength'), pow(symbol('flux'), number(2)), number(GAS_CONSTANT_AIR), symbol('headTemperature')),
  symbol('narrowedBore'),
);
const sonicEntry = frac(times(symbol('flux'), sqrt(symbol('headTemperature'))), times(number(ENTRY_COEFFICIENT), number(criticalFlowConstant())));

export const headPressure = defineSum({
  id: 'head-pressure',
  name: 'Head pressure from a narrowed line',
  purpose: 'See why a line that passes air freely at low flow still raises pressure and heat in the head at full delivery.',
  cautions: LINE_CAUTIONS,
  inputs: {
    ...lineInputs,
    narrowedBore: { ...lineInputs.narrowedBore, byDefault: toSi(0.1875, 'length', 'in') },
    delivery: deliveryFlow,
    systemPressure: input('Gauge pressure at the end of the line', 'p_sys', 'pressure', 'psi', { byDefault: 120, least: 0, most: 250, off: 3 }),
    inletTemperature,
    index: index(1.3),
    altitude,
  },
  outputs: {
    headPressure: output('Pressure at the head', 'p_head', 'pressure', 'psi'),
    headTemperature: output('Temperature at the head by compression', 'T_head', 'temperature', 'degF'),
    loss: output('What the line takes', 'Δp', 'pressure', 'psi'),
    nominalHeadPressure: output('Pressure at the head with the full bore', 'p_0', 'pressure', 'psi'),
    boreAt150Psi: output('Bore at which the head reaches 150 psi', 'd_150', 'length', 'in'),
    boreAt250Psi: output('Bore at which the head reaches 250 psi', 'd_250', 'length', 'in'),
  },
  main: 'headPressure',
  expression: minus(larger(sqrt(plus(pow(larger(symbol('afterNarrowed'), sonicExit), number(2)), friction)), sonicEntry), symbol('atmosphere')),
  terms: {
    flux: output('Mass flow by area where narrowed, kg/(s m²)', 'G', 'ratio', 'one'),
    factor: output('Friction factor where narrowed', 'f', 'ratio', 'one'),
    afterNarrowed: output('Pressure behind the narrowed part, absolute', 'p_m', 'absolutePressure', 'psia'),
    atmosphere: output('Air around, absolute', 'p_a', 'absolutePressure', 'psia'),
  },
  assumptions: [
    'The compressor delivers as much as you gave, whatever the head pressure. A real one delivers less against more.',
    'The air is as hot along the whole line as at the head, where one compression from the intake made it so.',
    SMOOTH_WALL,
  ],
  cannotTell: [PULSES, 'The pressure at the head when valves leak or coolant does not reach the head.'],
  source: 'Flow of a gas at one temperature in a pipe (Darcy and Weisbach, Churchill 1977), limited by the speed of sound; polytropic compression.',
  compute: (given) => {
    requireWithin('narrowedLength', 'length', given.narrowedLength, { least: 0, most: given.length });
    requireWithin('narrowedBore', 'length', given.narrowedBore, { least: 0, most: given.nominalBore });
    const atmosphere = standardAtmosphere(given.altitude);
    const line = { lengthM: given.length, nominalBoreM: given.nominalBore, narrowedLengthM: given.narrowedLength, narrowedBoreM: given.narrowedBore };
    const delivery: Delivery = {
      freeAirFlowM3PerS: given.delivery,
      freeAirDensityKgPerM3: airDensity(atmosphere, FREE_AIR_TEMPERATURE),
      inletTemperatureK: temperature(given.inletTemperature),
      inletPressurePa: atmosphere,
      index: given.index,
      systemPressurePa: toAbsolute(gaugePressure(given.systemPressure), atmosphere),
    };
    const head = solve(line, delivery);
    if (head.kind === 'beyond') return { kind: 'never', because: 'The head would pass any pressure that it can hold, and something gives before that: the line is as good as blocked.' };
    if (head.kind === 'not-settled') return { kind: 'never', because: 'No steady pressure was found for these numbers.' };

    const nominal = solve({ ...line, narrowedBoreM: line.nominalBoreM }, delivery);
    const boreAt = (limit: typeof LIMIT_1): number | undefined => {
      if (limit <= given.systemPressure) return undefined;
      const found = boreForHeadPressure(line, delivery, toAbsolute(limit, atmosphere));
      return found.kind === 'bore' ? found.boreM : undefined;
    };
    const [boreAt150Psi, boreAt250Psi] = [boreAt(LIMIT_1), boreAt(LIMIT_2)];
    const massFlowKgPerS = massFlowOf(delivery.freeAirFlowM3PerS, delivery.freeAirDensityKgPerM3);
    return {
      values: {
        headPressure: toGauge(head.headPressurePa, atmosphere),
        headTemperature: head.headTemperatureK,
        loss: head.lossPa,
        nominalHeadPressure: nominal.kind === 'settled' ? toGauge(nominal.headPressurePa, atmosphere) : undefined,
        boreAt150Psi,
        boreAt250Psi,
        flux: massFlux(massFlowKgPerS, given.narrowedBore),
        factor: head.frictionFactor,
        afterNarrowed: upstreamPressure({
          lengthM: given.length - given.narrowedLength,
          boreM: given.nominalBore,
          massFlowKgPerS,
          airTemperatureK: head.headTemperatureK,
          downstreamPressurePa: delivery.systemPressurePa,
        }),
        atmosphere,
      },
      notes: [
        PULSES,
        ...(head.choked ? ['The air reaches the speed of sound in the narrowed part.'] : []),
        ...(boreAt150Psi === undefined || boreAt250Psi === undefined ? ['Where no bore is given, the head is past that pressure with its full bore already.'] : []),
      ],
    };
  },
  plot: {
    title: 'Pressure at the head against the bore left in the line',
    x: 'narrowedBore',
    range: ({ nominalBore = 0 }) => [nominalBore / 8, nominalBore],
    series: ['headPressure'],
    marks: [
      { label: 'A safety valve at the head opens, 250 psi', at: () => LIMIT_2 },
      { label: 'A safety valve at the wet tank opens, 150 psi', at: () => LIMIT_1 },
      { label: 'At the end of the line', at: ({ systemPressure = 0 }) => systemPressure },
    ],
  },
});
