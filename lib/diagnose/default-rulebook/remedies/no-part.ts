import type { Remedy } from '../../types';
import { NORMAL_CARRYOVER, SOMETHING_ELSE } from '../../types';
import { makeSafe, startTheWatch } from './common-steps';

export const remedies: Remedy[] = [
  {
    id: 'repair-nothing',
    station: null,
    name: 'Repair nothing, and keep watching',
    causes: [NORMAL_CARRYOVER],
    look: { minutes: 15 },
    fix: { minutes: 0 },
    parts: [],
    seenInBay: false,
    steps: [
      ...makeSafe,
      'See that build-up, cut-out, cut-in, leak-down, intake and drain have been measured and are in order; if one is missing, measure it now.',
      'Weigh what you caught and set it against the engine hours and the time loaded. Keep it as this unit’s healthy baseline.',
      'Drain the tanks once and look: no oil beyond the wet tank. Oil at the service tanks or valves is never normal.',
      'Tell whoever complained what is ordinary, when the cartridge is due, and what would be a reason to come back.',
      startTheWatch,
    ],
    cautions: ['vehicle-rolls', 'pressure-falls-suspension-brakes', 'stored-air', 'oil-mist-and-noise'],
    basis: 'common practice',
    source: 'Steps: common practice, no source. Minutes: judgement.',
  },
];

/** Causes that no remedy of the default rulebook removes, and why. */
export const causesWithoutRemedy: Record<string, string> = {
  [SOMETHING_ELSE]: 'Nobody can say what to do about an unknown cause: the case is referred on, at the service cost.',
};
