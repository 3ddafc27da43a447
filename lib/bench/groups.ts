/** The sums by what one asks, in the order in which a technician meets them. `tests/unit/bench` sees that none is missing. */
export const GROUPS: readonly { name: string; sums: readonly [string, ...string[]] }[] = [
  { name: 'Building up', sums: ['measured-build-up', 'build-up', 'build-up-limit', 'required-reservoir', 'delivery'] },
  { name: 'Leaks and work', sums: ['leak-down', 'leak-size', 'time-loaded'] },
  { name: 'Head and discharge line', sums: ['discharge-temperature', 'compression-index', 'line-loss', 'head-pressure'] },
  { name: 'Oil', sums: ['carry-over', 'carry-over-by-weight', 'drain-capacity'] },
  { name: 'Openings', sums: ['orifice-flow', 'break-in-bleed'] },
];
