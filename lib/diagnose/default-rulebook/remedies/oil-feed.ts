import type { Remedy } from '../../types';
import { breakInRun, cleanDownstream, makeSafe, makeSafeAndDrain, startTheWatch } from './common-steps';

export const remedies: Remedy[] = [
  {
    id: 'replace-oil-feed-line',
    station: 'oil-feed',
    name: 'Renew the oil feed line',
    causes: ['oil-feed-restricted'],
    look: { minutes: 20 },
    fix: { minutes: 40 },
    parts: [{ name: 'Oil feed line and seals', cost: 60 }],
    // Pressure at the feed tells at once.
    seenInBay: true,
    steps: [
      ...makeSafeAndDrain,
      'Take the feed line off and look through it. Compare its bore with a new one; a line that looks sound outside can be collapsed or sludged inside.',
      'Look into both ports for sealant or a gasket that covers them, and into the filter screen where there is one.',
      'Fit a new line without kinks, clear of heat and sharp edges, to the maker’s values. Prime the compressor with clean oil.',
      'Start, and measure oil pressure at the feed at hot idle: about 15 psi (1 bar) or more, or the maker’s figure.',
      'The compressor knocked, turns stiffly or has run dry: its bearings are hurt, and a new line won’t heal them. Go on to the compressor, with the cause now gone.',
      ...breakInRun,
    ],
    cautions: [
      'vehicle-rolls',
      'exhaust-fumes',
      'pressure-falls-suspension-brakes',
      'stored-air',
      'hot-parts',
      'belts-fan-gears',
      'oil-mist-and-noise',
    ],
    basis: 'common practice',
    source: 'Steps: common practice, no source; 15 psi at idle from memory. Minutes and costs: judgement.',
  },
  {
    id: 'change-engine-oil',
    station: 'oil-feed',
    name: 'Change engine oil and filter',
    causes: ['oil-degraded'],
    look: { minutes: 15 },
    fix: { minutes: 45 },
    parts: [
      { name: 'Engine oil', cost: 180 },
      { name: 'Oil filter', cost: 40 },
    ],
    seenInBay: false,
    steps: [
      ...makeSafe,
      'Draw a sample before you drain: smell it for fuel, look for soot and water, and send it for analysis where your workshop does that.',
      'Drain hot, change the filter, and fill with the grade that the engine maker names, to the full mark and not above.',
      'Fuel in the oil comes from somewhere: find and cure the leak, or the next fill will be the same.',
      'Look into the head of the discharge line for baked oil. Bad oil cokes early, and a narrowed line needs changing too.',
      ...cleanDownstream,
      startTheWatch,
    ],
    cautions: [
      'vehicle-rolls',
      'pressure-falls-suspension-brakes',
      'stored-air',
      'hot-parts',
      'carbon-fire',
      'oil-in-brake-system',
    ],
    basis: 'common practice',
    source: 'Steps: common practice, no source. Minutes and costs: judgement.',
  },
];
