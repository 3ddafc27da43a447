import { oilContent, oilPerLoadedTime, oilPerTime, requireReadings } from '../carry-over';
import { frac, symbol } from '../formula/expression';
import { deliveryFlow } from './inputs';
import { defineSum, input, output } from './sum';

export const carryOver = defineSum({
  id: 'carry-over',
  name: 'Oil carry-over',
  purpose: 'Turn the oil you caught into a rate that can be compared with the unit’s own past, and see how sure it is.',
  cautions: ['Drain with the engine off and point the outlet away from you: oil and water come out with air behind them. Protect your eyes.'],
  inputs: {
    caught: input('Oil caught, all readings together', 'V', 'volume', 'mL', {
      byDefault: 30,
      least: 0,
      most: 20_000,
      off: 1,
      totalOf: 'readings',
      note: 'Without the water: let it stand, or weigh it after drying. The error is of one reading.',
    }),
    readings: input('Readings', 'k', 'count', 'one', { optional: true, byDefault: 1, least: 1, most: 500, note: 'How many times you emptied and read the cup.' }),
    time: input('Time the engine ran', 't', 'engineHours', 'h', { byDefault: 20, least: 0.1, most: 20_000, off: 0.1 }),
    shareLoaded: input('Share of time loaded', 'D', 'ratio', 'percent', { optional: true, byDefault: 25, least: 1, most: 100, share: 0.1 }),
    delivery: { ...deliveryFlow, optional: true },
    density: input('Density of the oil', 'ρ', 'density', 'g/mL', { optional: true, byDefault: 0.87, least: 0.7, most: 1.1, off: 0.01 }),
  },
  outputs: {
    perHour: output('Oil per hour', 'q', 'oilRate', 'mL/h'),
    perLoadedHour: output('Oil per hour loaded', 'q_L', 'oilRate', 'mL/h'),
    content: output('Oil in the air delivered', 'c', 'concentration', 'mg/m3'),
  },
  main: 'perHour',
  expression: frac(symbol('caught'), symbol('time')),
  terms: {},
  assumptions: ['What was caught is all that passed: the rest went on to the dryer or out with the purge.', 'Readings are off independently, so that several together are surer than their number makes them off.'],
  cannotTell: ['How much is normal for every compressor: compare with this unit’s and this model’s own readings.', 'Whether oil came past rings, drain or intake.'],
  source: 'Definition; errors by JCGM 100:2008 (GUM).',
  compute: ({ caught, readings, time, shareLoaded, delivery, density }) => {
    requireReadings(readings);
    const collected = { caughtM3: caught, timeS: time };
    return {
      values: {
        perHour: oilPerTime(collected),
        perLoadedHour: oilPerLoadedTime({ ...collected, shareLoaded }),
        content: oilContent({ ...collected, shareLoaded, oilDensityKgPerM3: density, deliveryM3PerS: delivery }),
      },
    };
  },
});
