import { gaugePressure, toSi } from '@/lib/units';
import { freeAirOfRise } from '../build-up';
import { frac, minus, symbol, times } from '../formula/expression';
import { requireWithin } from '../out-of-range';
import { buildUpLimit as limit } from '../reservoir';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude } from './inputs';
import { defineSum, input, output } from './sum';

/** The rise that the limit is for: 85 to 100 psi. */
const RISE_OF_LIMIT = toSi(15, 'pressure', 'psi');
/** Below it a gauge tells more of itself than of the compressor. */
const LEAST_RISE = toSi(5, 'pressure', 'psi');

const volume = { least: 50, most: 200_000 };

export const measuredBuildUp = defineSum({
  id: 'measured-build-up',
  name: 'Measured build-up',
  purpose: 'Turn the build-up that you timed into one that can be judged, whatever the tanks hold and wherever the gauge began.',
  cautions: ['The engine runs: level ground, chocks in, transmission in neutral, hands and clothes away from belts and fan, exhaust led outdoors.'],
  inputs: {
    time: input('Time that it took', 't', 'duration', 's', { byDefault: 30, least: 1, most: 3600, off: 0.5, note: 'At the engine’s maximum recommended speed.' }),
    fromPressure: input('From a gauge pressure of', 'p_1', 'pressure', 'psi', { optional: true, byDefault: 85, least: 0, most: 200, off: 0.5, note: 'Both read on the same gauge, so that only reading it counts.' }),
    toPressure: input('To a gauge pressure of', 'p_2', 'pressure', 'psi', { optional: true, byDefault: 100, least: 5, most: 250, off: 0.5 }),
    actualVolume: input('Reservoirs fitted', 'V', 'volume', 'in3', { byDefault: 5600, ...volume, share: 0.01, note: 'All that fill in this test, by the plates on the tanks.' }),
    requiredVolume: input('Reservoirs required', 'V_req', 'volume', 'in3', { byDefault: 5568, ...volume, note: 'Twelve times the service chambers: see the sum for it.' }),
    altitude,
  },
  outputs: {
    corrected: output('Time for the tanks required, 85 to 100 psi', 't_c', 'duration', 's'),
    limit: output('Time that a new vehicle with these tanks is allowed', 't_lim', 'duration', 's'),
    ofLimit: output('Of the time allowed', 't_c/25 s', 'ratio', 'percent'),
    delivery: output('Air delivered into the tanks, free air', 'Q', 'flow', 'cfm'),
  },
  main: 'corrected',
  expression: times(symbol('time'), frac(symbol('requiredVolume'), symbol('actualVolume')), frac(symbol('rise'), minus(symbol('toPressure'), symbol('fromPressure')))),
  terms: { rise: output('Rise from 85 to 100 psi', 'Δp', 'pressure', 'psi') },
  assumptions: ['The same air is delivered over the whole rise.', 'The air in the tanks keeps its temperature.'],
  cannotTell: ['Whether the compressor delivers too little or the tanks leak: what leaks meanwhile is not in it.', 'What a vehicle in service must do: the limit binds new vehicles, and is a reference after that.'],
  source: '49 CFR 571.121 S5.1.1 for the limit (United States, new trucks and buses); proportion of rise and volume by the ideal gas at one temperature.',
  compute: (given) => {
    requireWithin('toPressure', 'pressure', given.toPressure, { least: given.fromPressure + LEAST_RISE });
    const overRise = given.time * (RISE_OF_LIMIT / (given.toPressure - given.fromPressure));
    const allowed = limit({ actualVolumeM3: given.actualVolume, requiredVolumeM3: given.requiredVolume });
    const air = freeAirOfRise({
      volumeM3: given.actualVolume,
      fromPressurePa: gaugePressure(given.fromPressure),
      toPressurePa: gaugePressure(given.toPressure),
      atmospherePa: standardAtmosphere(given.altitude),
    });
    const corrected = overRise * (given.requiredVolume / given.actualVolume);
    return { values: { corrected, limit: allowed, ofLimit: overRise / allowed, delivery: air / given.time, rise: RISE_OF_LIMIT } };
  },
});
