import { notNegative, unit, type QuantityDefinition } from '../definition';

/** A share or a ratio: time loaded, drive ratio. Stored as the plain number, so 25 % is 0.25. */
export const ratio = {
  noun: 'ratio',
  called: 'a share or a ratio',
  siUnit: '1',
  units: {
    percent: unit('%', 'percent', 0.01, { digits: 1, spellings: ['per cent', 'pct', 'pc'] }),
    one: unit('', 'plain number', 1, { digits: 3, spellings: ['x', 'times'] }),
  },
  examples: ['25 %', '1.5:1'],
  min: notNegative('A share or a ratio cannot be less than zero.'),
  colon: 'ratio',
  fractionUnit: 'one',
} satisfies QuantityDefinition;

/** How many: cylinders, gear teeth, purges heard. */
export const count = {
  noun: 'number',
  called: 'a whole number',
  siUnit: '1',
  units: {
    one: unit('', 'plain number', 1, { spellings: ['x', 'times', 'pcs'] }),
  },
  examples: ['2', '1,200'],
  min: notNegative('A count cannot be less than zero.'),
  grouped: true,
  whole: true,
} satisfies QuantityDefinition;
