import { frac, plus, symbol } from '../formula/expression';
import { demand, timeLoaded as sum } from '../time-loaded';
import { deliveryFlow } from './inputs';
import { defineSum, input, output } from './sum';

export const timeLoaded = defineSum({
  id: 'time-loaded',
  name: 'Time loaded',
  purpose: 'See whether the compressor works too much, and how much air the vehicle uses and leaks.',
  cautions: ['The engine runs: level ground, chocks in, hands and clothes away from belts and fan, exhaust led outdoors.'],
  inputs: {
    loaded: input('Time loaded', 't_1', 'duration', 's', { byDefault: 30, least: 1, most: 360_000, off: 0.5, note: 'From cut-in to cut-out; several cycles together tell more.' }),
    unloaded: input('Time unloaded', 't_2', 'duration', 's', { byDefault: 150, least: 0, most: 3_600_000, off: 0.5 }),
    delivery: { ...deliveryFlow, optional: true },
  },
  outputs: {
    share: output('Share of time loaded', 'D', 'ratio', 'percent'),
    demand: output('Used and leaked, free air', 'Q_D', 'flow', 'cfm'),
  },
  main: 'share',
  expression: frac(symbol('loaded'), plus(symbol('loaded'), symbol('unloaded'))),
  terms: {},
  assumptions: ['The run is like the work that you ask about: parked and idling tells of leaks alone.'],
  cannotTell: ['Leaks from use, and both from a compressor that is small or worn: compare with leak-down and delivery.'],
  source: 'Share of load and unload times, as in guides on compressed air; about a quarter or less is common practice on long hauls.',
  compute: ({ loaded, unloaded, delivery }) => {
    const share = sum({ loadedS: loaded, unloadedS: unloaded });
    return { values: { share, demand: demand({ share, deliveryM3PerS: delivery }) } };
  },
});
