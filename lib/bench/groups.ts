import { LINE_SURVEY } from './line-survey';

interface Page {
  readonly id: string;
  readonly name: string;
  readonly purpose: string;
}

/** The pages of the bench by what one asks, in the order in which a technician meets them: sums, and what else is worked out there. `tests/unit/bench` sees that no sum is missing. */
export const GROUPS: readonly { name: string; sums: readonly [string, ...string[]]; others?: readonly Page[] }[] = [
  { name: 'Building up', sums: ['measured-build-up', 'build-up', 'build-up-ratio', 'build-up-limit', 'required-reservoir', 'delivery'] },
  { name: 'Leaks and work', sums: ['leak-down', 'leak-size', 'time-loaded'] },
  { name: 'Head and discharge line', sums: ['discharge-temperature', 'compression-index', 'line-loss', 'head-pressure'], others: [LINE_SURVEY] },
  { name: 'Oil', sums: ['carry-over', 'carry-over-by-weight', 'drain-capacity'] },
  { name: 'Openings', sums: ['orifice-flow', 'break-in-bleed'] },
];
