import { toSi } from '@/lib/units';
import { frac, minus, symbol, times } from '../formula/expression';
import { requireWithin } from '../out-of-range';
import { expectedArrival } from './build-up';
import { altitude, deliveryFlow, reservoirVolume } from './inputs';
import { defineSum, input, output } from './sum';

/** Below it a gauge tells more of itself than of the compressor. */
const LEAST_RISE = toSi(5, 'pressure', 'psi');

export const buildUpRatio = defineSum({
  id: 'build-up-ratio',
  name: 'Measured against expected build-up',
  purpose: 'Put the build-up that you timed beside what this compressor should take for these tanks, with the leaks that you know of.',
  cautions: ['The engine runs: level ground, chocks in, transmission in neutral, hands and clothes away from belts and fan, exhaust led outdoors.'],
  inputs: {
    time: input('Time that it took', 't', 'duration', 's', { byDefault: 20, least: 1, most: 3600, off: 0.5, note: 'At the engine speed that the delivery is for.' }),
    volume: reservoirVolume,
    fromPressure: input('From a gauge pressure of', 'p_1', 'pressure', 'psi', { optional: true, byDefault: 85, least: 0, most: 200, off: 0.5, note: 'Both read on the same gauge, so that only reading it counts.' }),
    toPressure: input('To a gauge pressure of', 'p_2', 'pressure', 'psi', { optional: true, byDefault: 100, least: 5, most: 250, off: 0.5 }),
    delivery: deliveryFlow,
    leak: input('Leaks and use meanwhile', 'Q_L', 'flow', 'cfm', { optional: true, byDefault: 0, least: 0, most: 200, share: 0.1, note: 'Free air: from the sum for leak-down. Left empty, nothing leaks.' }),
    altitude,
  },
  outputs: {
    ratio: output('Of the time expected', 't/t_x', 'ratio', 'percent'),
    expected: output('Time expected', 't_x', 'duration', 's'),
  },
  main: 'ratio',
  expression: frac(times(symbol('time'), minus(symbol('delivery'), symbol('leak')), symbol('atmosphere')), times(symbol('volume'), minus(symbol('toPressure'), symbol('fromPressure')))),
  terms: { atmosphere: output('Air around, absolute', 'p_a', 'absolutePressure', 'psia') },
  assumptions: ['The air in the tanks has the temperature of the air around. Hot air fills them sooner, and loses it again as it cools.', 'Delivery and leak stay the same between both pressures.'],
  cannotTell: ['Whether air is lost in the compressor, held back after it or never drawn in.', 'More than the delivery that you put in: what a model should give is for a new one, at its speed.'],
  source: 'Ideal gas at one temperature.',
  compute: (given) => {
    requireWithin('toPressure', 'pressure', given.toPressure, { least: given.fromPressure + LEAST_RISE });
    const { atmosphere, arrival } = expectedArrival(given);
    if (arrival.kind === 'never') return { kind: 'never', because: 'As much leaks as is delivered: by these figures the tanks never fill.' };
    return { values: { ratio: given.time / arrival.timeS, expected: arrival.timeS, atmosphere } };
  },
});
