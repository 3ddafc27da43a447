import { gaugePressure, temperature } from '@/lib/units';
import { frac, minus, symbol, times } from '../formula/expression';
import { dutyOfLeak, leakDown as sum } from '../leak-down';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, deliveryFlow, reservoirVolume } from './inputs';
import { defineSum, input, output } from './sum';

const gauge = { least: 1, most: 300, off: 0.5 };

export const leakDown = defineSum({
  id: 'leak-down',
  name: 'Leak-down',
  purpose: 'Turn the fall of a gauge into the air that leaks, with what cooling took set right, and see what it asks of the compressor.',
  cautions: [
    'Chock the wheels on level ground before the brakes are released. Spring brakes apply and air suspension drops as pressure falls: nobody under the vehicle.',
    'The tanks stay under pressure. Never feel for a leak with a hand.',
  ],
  inputs: {
    volume: reservoirVolume,
    startPressure: input('Gauge at the start', 'p_s', 'pressure', 'psi', { byDefault: 120, ...gauge, note: 'Both read on the same gauge, so that only reading it counts.' }),
    endPressure: input('Gauge at the end', 'p_e', 'pressure', 'psi', { byDefault: 118, ...gauge }),
    time: input('Time between', 't', 'duration', 'min', { byDefault: 2, least: 0.1, most: 1440, off: 0.5 / 60 }),
    startTemperature: input('Tanks at the start', 'T_s', 'temperature', 'degF', {
      optional: true,
      byDefault: 70,
      least: -60,
      most: 300,
      off: 0.25,
      note: 'On the skin of a tank, both times at the same spot.',
    }),
    endTemperature: input('Tanks at the end', 'T_e', 'temperature', 'degF', { optional: true, byDefault: 70, least: -60, most: 300, off: 0.25 }),
    delivery: { ...deliveryFlow, optional: true },
    altitude,
  },
  outputs: {
    leak: output('Leak, mean over the test', 'Q_L', 'flow', 'cfm'),
    leakAtStart: output('Leak at the pressure of the start', 'Q_s', 'flow', 'cfm'),
    fallRate: output('Fall without cooling', 'Δp/t', 'pressureRate', 'psi/min'),
    duty: output('Time loaded that the leak alone asks for', 'D', 'ratio', 'percent'),
  },
  main: 'leak',
  expression: frac(times(symbol('volume'), minus(symbol('startAbsolute'), times(symbol('endAbsolute'), frac(symbol('startTemperature'), symbol('endTemperature'))))), times(symbol('time'), symbol('atmosphere'))),
  terms: {
    startAbsolute: output('Pressure at the start, absolute', 'p_1', 'absolutePressure', 'psia'),
    endAbsolute: output('Pressure at the end, absolute', 'p_2', 'absolutePressure', 'psia'),
    atmosphere: output('Air around, absolute', 'p_a', 'absolutePressure', 'psia'),
  },
  assumptions: ['The air in the tanks has the temperature of their skin.', 'No air is used or delivered meanwhile.', 'The leak grows with the absolute pressure, as through a small hole.'],
  cannotTell: ['Where it leaks.', 'What leaks only with the brakes applied, or only while the engine runs.'],
  source: 'Ideal gas; correction for temperature as in UFC 4-390-01. The factor 1.25 of plant handbooks is for a pressure that halves, and is not used.',
  compute: (given) => {
    const atmosphere = standardAtmosphere(given.altitude);
    const found = sum({
      volumeM3: given.volume,
      startPressurePa: gaugePressure(given.startPressure),
      endPressurePa: gaugePressure(given.endPressure),
      timeS: given.time,
      startTemperatureK: temperature(given.startTemperature),
      endTemperatureK: temperature(given.endTemperature),
      atmospherePa: atmosphere,
    });
    const duty = dutyOfLeak({ leakM3PerS: Math.max(0, found.leakAtStartM3PerS), deliveryM3PerS: given.delivery });
    const notes = [
      ...(found.meanLeakM3PerS < 0 ? ['Without cooling the pressure has risen: no leak can be told from these readings.'] : []),
      ...(duty.kind === 'never unloads' ? ['So much leaks that the compressor never unloads.'] : []),
    ];
    return {
      values: {
        leak: found.meanLeakM3PerS,
        leakAtStart: found.leakAtStartM3PerS,
        fallRate: found.fallPaPerS,
        duty: duty.kind === 'share' ? duty.share : undefined,
        startAbsolute: given.startPressure + atmosphere,
        endAbsolute: given.endPressure + atmosphere,
        atmosphere,
      },
      notes,
    };
  },
});
