import { notNegative, per, unit, type QuantityDefinition } from '../definition';
import { DAY, HOUR, MINUTE, YEAR } from '../factors';

export const SECONDS = ['s', 'sec', 'secs', 'second', 'seconds'];
export const MINUTES = ['min', 'mins', 'minute', 'minutes'];
export const HOURS = ['h', 'hr', 'hrs', 'hour', 'hours'];

/** How long something took, or how old it is. */
export const duration = {
  noun: 'time',
  called: 'a length of time',
  siUnit: 's',
  units: {
    s: unit('s', 'seconds', 1, { digits: 1, spellings: SECONDS }),
    min: unit('min', 'minutes', MINUTE, { digits: 1, spellings: [...MINUTES, 'm'] }),
    h: unit('h', 'hours', HOUR, { digits: 1, spellings: HOURS }),
    d: unit('d', 'days', DAY, { digits: 1, spellings: ['day'] }),
    wk: unit('wk', 'weeks', 7 * DAY, { digits: 1, spellings: ['week', 'wks'] }),
    mo: unit('mo', 'months', YEAR / 12, { digits: 1, spellings: ['month', 'mos', 'mth', 'mths'] }),
    yr: unit('yr', 'years', YEAR, { digits: 1, spellings: ['year', 'yrs', 'y'] }),
  },
  examples: ['48 s', '1:30'],
  min: notNegative('A time cannot be less than zero.'),
  compound: true,
  colon: 'clock',
} satisfies QuantityDefinition;

/** The reading of an hour meter. Apart from duration, because hour meters have large numbers and one unit. */
export const engineHours = {
  noun: 'engine hours',
  called: 'a number of engine hours',
  siUnit: 's',
  units: {
    h: unit('h', 'hours', HOUR, { digits: 1, spellings: [...HOURS, 'engine hours', 'eng hrs', 'eh'] }),
  },
  examples: ['12,400 h', '200 h'],
  min: notNegative('Engine hours cannot be less than zero.'),
  grouped: true,
} satisfies QuantityDefinition;

/** How often something happens, such as the governor's cycles while parked. */
export const cycleRate = {
  noun: 'rate of cycles',
  called: 'a rate of cycles',
  siUnit: '1/s',
  units: {
    'per h': unit('per h', 'per hour', 1 / HOUR, { digits: 1, spellings: cycles(HOURS) }),
    'per min': unit('per min', 'per minute', 1 / MINUTE, { digits: 1, spellings: cycles(MINUTES) }),
  },
  examples: ['6 per hour', '0.5 per min'],
  min: notNegative('A rate cannot be less than zero.'),
} satisfies QuantityDefinition;

function cycles(times: readonly string[]): string[] {
  return per(['', 'cycles', 'cycle', 'times', 'x'], times);
}

/** Turns in a time, as the rotational frequency 1/s of ISO 80000-3: not radians, so a displacement times it is a delivery. */
export const rotationalSpeed = {
  noun: 'rotational speed',
  called: 'a rotational speed',
  siUnit: '1/s',
  units: {
    rpm: unit('rpm', 'revolutions per minute', 1 / MINUTE, { spellings: ['r/min', 'rev/min', 'revs/min', 'revs', 'rpms'] }),
    'r/s': unit('r/s', 'revolutions per second', 1, { digits: 2, spellings: ['rps', 'rev/s', 'rev/sec'] }),
  },
  examples: ['1,000 rpm', '600 rpm'],
  min: notNegative('A rotational speed cannot be less than zero.'),
  grouped: true,
} satisfies QuantityDefinition;
