import { gaugePressure } from '@/lib/units';
import { buildUpTime } from '../build-up';
import { frac, minus, number, symbol, times } from '../formula/expression';
import { requireWithin } from '../out-of-range';
import { buildUpLimit as limit, requiredReservoirVolume } from '../reservoir';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, deliveryFlow, reservoirVolume } from './inputs';
import { defineSum, input, output } from './sum';

const RUNNING = 'The engine runs: level ground, chocks in, transmission in neutral, hands and clothes away from belts and fan, exhaust led outdoors.';

/** When the tanks are filled, by what the inputs of the sums that expect it give. */
export function expectedArrival(given: { readonly [Name in 'volume' | 'fromPressure' | 'toPressure' | 'delivery' | 'leak' | 'altitude']: number }) {
  const atmosphere = standardAtmosphere(given.altitude);
  const arrival = buildUpTime({
    volumeM3: given.volume,
    fromPressurePa: gaugePressure(given.fromPressure),
    toPressurePa: gaugePressure(given.toPressure),
    deliveryM3PerS: given.delivery,
    leakM3PerS: given.leak,
    atmospherePa: atmosphere,
  });
  return { atmosphere, arrival };
}

export const buildUp = defineSum({
  id: 'build-up',
  name: 'Expected build-up time',
  purpose: 'See how long your tanks should take to fill, to put beside what you timed.',
  cautions: [RUNNING],
  inputs: {
    volume: reservoirVolume,
    fromPressure: input('From a gauge pressure of', 'p_1', 'pressure', 'psi', { optional: true, byDefault: 85, least: 0, most: 200, off: 0.5, note: 'Both read on the same gauge, so that only reading it counts.' }),
    toPressure: input('To a gauge pressure of', 'p_2', 'pressure', 'psi', { optional: true, byDefault: 100, least: 1, most: 250, off: 0.5 }),
    delivery: deliveryFlow,
    leak: input('Leaks and use meanwhile', 'Q_L', 'flow', 'cfm', { optional: true, byDefault: 0, least: 0, most: 200, share: 0.1, note: 'Free air: from the sum for leak-down. Left empty, nothing leaks.' }),
    altitude,
  },
  outputs: { time: output('Time to build up', 't', 'duration', 's') },
  main: 'time',
  expression: frac(times(symbol('volume'), minus(symbol('toPressure'), symbol('fromPressure'))), times(minus(symbol('delivery'), symbol('leak')), symbol('atmosphere'))),
  terms: { atmosphere: output('Air around, absolute', 'p_a', 'absolutePressure', 'psia') },
  assumptions: ['The air in the tanks has the temperature of the air around. Hot air fills them sooner, and loses it again as it cools.', 'Delivery and leak stay the same between both pressures.'],
  cannotTell: ['Which of delivery, leaks and volume is to blame when the time you measured is longer.'],
  source: 'Ideal gas at one temperature.',
  compute: (given) => {
    requireWithin('toPressure', 'pressure', given.toPressure, { least: given.fromPressure });
    const { atmosphere, arrival } = expectedArrival(given);
    if (arrival.kind === 'never') return { kind: 'never', because: 'As much leaks as is delivered: the tanks never fill.' };
    return { values: { time: arrival.timeS, atmosphere } };
  },
  plot: {
    title: 'Time to build up against leaks',
    x: 'leak',
    range: ({ delivery = 0 }) => [0, 0.95 * delivery],
    series: ['time'],
    marks: [],
  },
});

export const buildUpLimit = defineSum({
  id: 'build-up-limit',
  name: 'Build-up limit of a new vehicle',
  purpose: 'Find the time that a new truck or bus is allowed from 85 to 100 psi: it grows with the tanks.',
  cautions: [RUNNING],
  inputs: {
    actualVolume: input('Reservoirs fitted', 'V', 'volume', 'in3', { byDefault: 5600, least: 50, most: 200_000, share: 0.01 }),
    requiredVolume: input('Reservoirs required', 'V_req', 'volume', 'in3', { byDefault: 5568, least: 50, most: 200_000, note: 'Twelve times the service chambers: see the sum for it.' }),
  },
  outputs: { limit: output('Time allowed', 't', 'duration', 's') },
  main: 'limit',
  expression: times(number(25), frac(symbol('actualVolume'), symbol('requiredVolume'))),
  terms: {},
  assumptions: ['The engine turns at its maximum recommended speed.'],
  cannotTell: ['What a vehicle in service must do: the limit binds new vehicles, and is a reference after that.'],
  source: '49 CFR 571.121 S5.1.1 (United States, new trucks and buses).',
  compute: ({ actualVolume, requiredVolume }) => ({ values: { limit: limit({ actualVolumeM3: actualVolume, requiredVolumeM3: requiredVolume }) } }),
});

export const requiredReservoir = defineSum({
  id: 'required-reservoir',
  name: 'Reservoir volume required',
  purpose: 'Find how large the reservoirs of a new truck or bus must be for its brake chambers.',
  cautions: [],
  inputs: {
    chamberVolume: input('Service chambers together', 'V_c', 'volume', 'in3', { byDefault: 464, least: 5, most: 20_000, note: 'Rated volumes at full stroke: two of type 20 and four of type 30 have 464 in³.' }),
  },
  outputs: { volume: output('Reservoirs required', 'V_req', 'volume', 'in3') },
  main: 'volume',
  expression: times(number(12), symbol('chamberVolume')),
  terms: {},
  assumptions: ['Chambers by their rated volume, not as measured.'],
  cannotTell: ['Whether the tanks hold what their plates say: water takes up room.'],
  source: '49 CFR 571.121 S5.1.2.1 (United States, new trucks and buses).',
  compute: ({ chamberVolume }) => ({ values: { volume: requiredReservoirVolume(chamberVolume) } }),
});
