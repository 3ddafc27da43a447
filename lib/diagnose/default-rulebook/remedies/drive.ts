import type { Remedy } from '../../types';
import { breakInRun, gasketAtTheMount, makeSafeAndDrain, proveTheAirSide } from './common-steps';

/** A failed crank or bearing has no remedy of its own: `replace-compressor` covers it. */
export const remedies: Remedy[] = [
  {
    id: 'replace-drive-gear',
    station: 'drive',
    name: 'Replace the drive gear',
    causes: ['drive-gear-failed'],
    look: { minutes: 60 },
    fix: { minutes: 150 },
    parts: [
      { name: 'Drive gear and fastener', cost: 190 },
      { name: 'Mounting gasket', cost: 15 },
    ],
    seenInBay: true,
    steps: [
      ...makeSafeAndDrain,
      'Support the compressor and take it off. Turn its crank by hand: it must turn freely, or the gear failed because the compressor locked.',
      'Look at every tooth of both gears. Steel with chipped or worn teeth goes; a sound one stays. A fibre gear is never reused: try whether its rim has let go of the hub.',
      'Collect every fragment. What is missing is in the gear case or the oil pan: find it, and ask engine diagnosis before the engine runs again.',
      'Fit the gear to a clean taper, as the maker says and with the maker’s value. Mind the timing where the compressor also drives or times another part.',
      ...gasketAtTheMount,
      'Check oil feed and drain, prime the compressor with clean oil, and turn the engine over by hand before it starts.',
      ...proveTheAirSide,
      ...breakInRun,
    ],
    cautions: [
      'vehicle-rolls',
      'exhaust-fumes',
      'pressure-falls-suspension-brakes',
      'stored-air',
      'hot-parts',
      'heavy-part',
      'belts-fan-gears',
      'oil-mist-and-noise',
    ],
    basis: 'common practice',
    source: 'Steps: common practice, no source. Minutes and costs: judgement.',
  },
];
