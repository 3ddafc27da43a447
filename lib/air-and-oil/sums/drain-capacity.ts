import { temperature, toSi } from '@/lib/units';
import { GRAVITY } from '../air';
import { SHARP_EDGED_LIQUID, drainCapacity as sum } from '../drain';
import { frac, number, plus, pow, sqrt, symbol, times } from '../formula/expression';
import { oilViscosity, viscosityLine } from '../oil-viscosity';
import { requireWithin } from '../out-of-range';
import { findRoot } from '../solve/find-root';
import { defineSum, input, output } from './sum';

const AT_40_C = temperature(toSi(40, 'temperature', 'degC'));
const AT_100_C = temperature(toSi(100, 'temperature', 'degC'));

/** 32 nu L / (g d2): height spent on drag, by speed. */
const drag = frac(times(number(32), symbol('viscosity'), symbol('length')), times(number(GRAVITY), pow(symbol('opening'), number(2))));
/** 1 / (2 g C2): height spent on motion, by the square of speed. */
const motion = frac(number(1), times(number(2 * GRAVITY), pow(symbol('dischargeCoefficient'), number(2))));
const speed = frac(times(number(2), symbol('height')), plus(drag, sqrt(plus(pow(drag, number(2)), times(number(4), motion, symbol('height'))))));

export const drainCapacity = defineSum({
  id: 'drain-capacity',
  name: 'What an oil drain can pass',
  purpose: 'See whether a drain that sealant has narrowed still passes all the oil that is fed, hot and cold.',
  cautions: ['Hot oil scalds. Measure the opening with the engine off and cold, and the feed with the flow caught, never by opening a fitting under pressure.'],
  inputs: {
    opening: input('Opening left', 'd', 'length', 'mm', { byDefault: 8, least: 0.5, most: 60, off: 0.25, note: 'The largest drill shank that passes.' }),
    length: input('Length of the opening', 'L', 'length', 'mm', { byDefault: 12, least: 0, most: 2000, off: 2, note: 'Through the flange and any bead of sealant.' }),
    height: input('Oil that can stand above it', 'h', 'length', 'mm', { byDefault: 25, least: 1, most: 2000, off: 3, note: 'From the end of the opening up to where oil reaches the crank or the rings.' }),
    oilTemperature: input('Oil', 'T', 'temperature', 'degF', { byDefault: 200, least: -20, most: 350, off: 10 }),
    viscosity40: input('Viscosity at 40 °C', 'ν_40', 'kinematicViscosity', 'cSt', { optional: true, byDefault: 110, least: 5, most: 1000, share: 0.03, note: 'From the data sheet. Left empty, a common 15W-40.' }),
    viscosity100: input('Viscosity at 100 °C', 'ν_100', 'kinematicViscosity', 'cSt', { optional: true, byDefault: 14.8, least: 2.5, most: 60, share: 0.03 }),
    feedFlow: input('Oil that is fed', 'Q_f', 'flow', 'L/min', { byDefault: 1, least: 0.01, most: 60, share: 0.1 }),
    dischargeCoefficient: input('Discharge coefficient', 'C', 'ratio', 'one', { optional: true, byDefault: SHARP_EDGED_LIQUID, least: 0.3, most: 1, off: 0.05 }),
  },
  outputs: {
    capacity: output('What the drain passes', 'Q', 'flow', 'L/min'),
    reserve: output('Of what is fed', 'Q/Q_f', 'ratio', 'percent'),
    openingNeeded: output('Opening that passes the feed', 'd_f', 'length', 'mm'),
    viscosity: output('Viscosity at this temperature', 'ν', 'kinematicViscosity', 'cSt'),
  },
  main: 'capacity',
  expression: times(frac(number(Math.PI), number(4)), pow(symbol('opening'), number(2)), speed),
  terms: {},
  assumptions: ['The opening is round and runs full; air can follow the oil another way.', 'Nothing but the height of the oil drives it: blow-by pressure below holds it back.'],
  cannotTell: ['What foam does: oil full of air takes more room and drains worse.'],
  source: 'Height spent on drag (Hagen and Poiseuille) and on motion (Torricelli), F. M. White, Fluid Mechanics; viscosity by ASTM D341.',
  compute: (given) => {
    requireWithin('viscosity100', 'kinematicViscosity', given.viscosity100, { most: 0.9 * given.viscosity40 });
    const line = viscosityLine({ temperatureK: AT_40_C, viscosityM2PerS: given.viscosity40 }, { temperatureK: AT_100_C, viscosityM2PerS: given.viscosity100 });
    const viscosityM2PerS = oilViscosity(line, temperature(given.oilTemperature));
    const flowThrough = (boreM: number) =>
      sum({ boreM, lengthM: given.length, heightM: given.height, viscosityM2PerS, dischargeCoefficient: given.dischargeCoefficient });
    const { flowM3PerS, mostlyDrag } = flowThrough(given.opening);
    const needed = findRoot((boreM) => flowThrough(boreM).flowM3PerS - given.feedFlow, { from: 1e-5, to: 1 });
    return {
      values: {
        capacity: flowM3PerS,
        reserve: flowM3PerS / given.feedFlow,
        openingNeeded: needed.converged ? needed.root : undefined,
        viscosity: viscosityM2PerS,
      },
      notes: [
        ...(flowM3PerS < given.feedFlow ? ['Less runs off than is fed: oil rises in the crankcase and goes past the rings.'] : []),
        ...(mostlyDrag ? ['The oil is thick for this opening: when it is cold the drain passes far less.'] : []),
      ],
    };
  },
  plot: {
    title: 'What the drain passes against the opening left',
    x: 'opening',
    range: ({ opening = 0 }) => [0.0005, Math.max(2 * opening, 0.012)],
    series: ['capacity'],
    marks: [{ label: 'Oil that is fed', at: ({ feedFlow = 0 }) => feedFlow }],
  },
});
