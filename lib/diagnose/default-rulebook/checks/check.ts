import type { Check, CheckState } from '../../types';

type Optional = 'kind' | 'tools' | 'setUp' | 'spoils' | 'cautions';

/** A check; what is left out is a choice, needs no tool and no set-up, spoils nothing and endangers nobody. */
export function check(given: Omit<Check, Optional> & Partial<Pick<Check, Optional>>): Check {
  return { kind: 'choice', tools: [], setUp: {}, spoils: [], cautions: [], ...given };
}

/** The answers of a yes/no check; `background` is the share of yes. */
export function yesNo(background: number, { yesHoldsRelease = false } = {}): CheckState[] {
  return [
    { id: 'no', label: 'No', background: 1 - background },
    { id: 'yes', label: 'Yes', background, ...(yesHoldsRelease && { holdsRelease: true as const }) },
  ];
}

/** The hazards of a check that needs the compressor off. */
export const WITH_THE_COMPRESSOR_OFF = [
  'vehicle-rolls', 'pressure-falls-suspension-brakes', 'stored-air', 'scalding-coolant', 'hot-parts', 'heavy-part', 'belts-fan-gears',
];

/** The hazards of a check that needs the head off. */
export const WITH_THE_HEAD_OFF = [
  'vehicle-rolls', 'pressure-falls-suspension-brakes', 'stored-air', 'scalding-coolant', 'hot-parts', 'carbon-fire',
];
