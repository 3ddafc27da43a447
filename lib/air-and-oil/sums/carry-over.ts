import { oilContent, oilPerLoadedTime, oilPerTime, oilVolume, requireReadings } from '../carry-over';
import { frac, symbol, times } from '../formula/expression';
import { deliveryFlow } from './inputs';
import { defineSum, input, output } from './sum';

/** Everything about a catch but how much it was. */
const run = {
  readings: input('Readings', 'k', 'count', 'one', { optional: true, byDefault: 1, least: 1, most: 500, note: 'How many times you emptied and read the cup.' }),
  time: input('Time the engine ran', 't', 'engineHours', 'h', { byDefault: 20, least: 0.1, most: 20_000, off: 0.1 }),
  shareLoaded: input('Share of time loaded', 'D', 'ratio', 'percent', { optional: true, byDefault: 25, least: 1, most: 100, share: 0.1 }),
  delivery: { ...deliveryFlow, optional: true },
  density: input('Density of the oil', 'ρ', 'density', 'g/mL', { optional: true, byDefault: 0.87, least: 0.7, most: 1.1, off: 0.01 }),
};

const about = {
  cautions: ['Drain with the engine off and point the outlet away from you: oil and water come out with air behind them. Protect your eyes.'],
  outputs: {
    perHour: output('Oil per hour', 'q', 'oilRate', 'mL/h'),
    perLoadedHour: output('Oil per hour loaded', 'q_L', 'oilRate', 'mL/h'),
    content: output('Oil in the air delivered', 'c', 'concentration', 'mg/m3'),
  },
  main: 'perHour',
  terms: {},
  assumptions: [
    'All that passed was caught: what went on to the dryer or out with the purge is missing from it.',
    'Readings are off independently, so that their errors partly cancel over many.',
  ],
  cannotTell: ['How much is normal for every compressor: compare with this unit’s and this model’s own readings.', 'Whether oil came past rings, drain or intake.'],
  source: 'Definition; errors by JCGM 100:2008 (GUM).',
} as const;

type Run = { readonly [K in keyof typeof run]: number };

function rates(caughtM3: number, { readings, time, shareLoaded, delivery, density }: Run) {
  requireReadings(readings);
  const collected = { caughtM3, timeS: time };
  return {
    values: {
      perHour: oilPerTime(collected),
      perLoadedHour: oilPerLoadedTime({ ...collected, shareLoaded }),
      content: oilContent({ ...collected, shareLoaded, oilDensityKgPerM3: density, deliveryM3PerS: delivery }),
    },
  };
}

export const carryOver = defineSum({
  ...about,
  id: 'carry-over',
  name: 'Oil carry-over, caught in a cup',
  purpose: 'Turn the oil you caught into a rate that can be compared with the unit’s own past, and see how sure it is.',
  inputs: {
    caught: input('Oil caught, all readings together', 'V', 'volume', 'mL', {
      byDefault: 30,
      least: 0,
      most: 20_000,
      off: 1,
      totalOf: 'readings',
      note: 'Without the water: let it stand and read the oil. The error is of one reading.',
    }),
    ...run,
  },
  expression: frac(symbol('caught'), symbol('time')),
  compute: ({ caught, ...rest }) => rates(caught, rest),
});

export const carryOverByWeight = defineSum({
  ...about,
  id: 'carry-over-by-weight',
  insteadOf: 'carry-over',
  name: 'Oil carry-over, caught and weighed',
  purpose: 'Turn the oil you weighed into a rate that can be compared with the unit’s own past, and see how sure it is.',
  inputs: {
    weight: input('Oil weighed, all readings together', 'm', 'mass', 'g', {
      byDefault: 26,
      least: 0,
      most: 20_000,
      off: 0.5,
      totalOf: 'readings',
      note: 'Without the cup and the water. The error is that of the scale, for one reading.',
    }),
    ...run,
  },
  expression: frac(symbol('weight'), times(symbol('density'), symbol('time'))),
  compute: ({ weight, ...rest }) => rates(oilVolume({ massKg: weight, oilDensityKgPerM3: rest.density }), rest),
});
