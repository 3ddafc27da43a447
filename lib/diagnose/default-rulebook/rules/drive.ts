import { judgement, weighedPractice } from '../basis';
import type { Rule } from '../../types';
import { answer, others } from './rule';

export const rules: Rule[] = [
  {
    name: 'crank-turns: stands-still',
    conditions: answer('crank-turns', 'stands-still'),
    weights: {
      ...others(-6.5), 'drive-gear-failed': 17, 'crank-or-bearing-failed': 12.5, 'oil-feed-restricted': 4.5,
      'normal-carryover': -15.5,
    },
    group: 'drive',
    note: 'The crank stands still while the engine turns: drive or crank has failed.',
    ...judgement,
  },
  {
    name: 'noise: knock',
    conditions: answer('noise', 'knock'),
    weights: {
      ...others(-4, { except: ['governor-faulty'] }), 'crank-or-bearing-failed': 11.9, 'oil-feed-restricted': 10.5,
      'drive-gear-failed': 5, 'valve-leaking': 3.5, 'rings-worn': 1.5, 'unloader-stuck': 0.5,
      'head-gasket-failed': -1.5, 'rings-not-seated': -3.5, 'dryer-overdue': -6.5,
      'purge-or-check-valve-leaking': -6.5, 'system-leaks': -6.5, 'normal-carryover': -9.5,
    },
    group: 'feed-and-bearings',
    note: 'A knock: a bearing or rod that has starved or worn.',
    ...judgement,
  },
  {
    name: 'noise: gear-noise',
    conditions: answer('noise', 'gear-noise'),
    weights: {
      ...others(-1.5), 'drive-gear-failed': 14, 'crank-or-bearing-failed': 7.5, 'oil-feed-restricted': 2,
      'rings-worn': 1, 'rings-not-seated': 1, 'valve-leaking': -1, 'head-gasket-failed': -1, 'governor-faulty': -1,
      'unloader-stuck': -1, 'dryer-overdue': -4, 'purge-or-check-valve-leaking': -4, 'system-leaks': -4,
      'normal-carryover': -7,
    },
    group: 'feed-and-bearings',
    note: 'A whine or rattle at the drive: the gear.',
    ...judgement,
  },
  {
    name: 'noise: hiss',
    conditions: answer('noise', 'hiss'),
    weights: {
      ...others(-2.5), 'purge-or-check-valve-leaking': 6, 'unloader-stuck': 5, 'system-leaks': 5,
      'valve-leaking': 4.5, 'head-gasket-failed': 4, 'governor-faulty': 2.5, 'rings-worn': -3, 'dryer-overdue': -3,
      'oil-feed-restricted': -4, 'crank-or-bearing-failed': -4.1, 'normal-carryover': -5.5, 'rings-not-seated': -7,
      'drive-gear-failed': -7,
    },
    group: 'feed-and-bearings',
    note: 'A hiss or blow: air goes where it shouldn’t.',
    ...judgement,
  },
  {
    name: 'drive-gear-kind: fibre',
    conditions: answer('drive-gear-kind', 'fibre'),
    weights: { 'drive-gear-failed': 5 },
    group: 'drive',
    note: 'The rim of a fibre gear can let go of its hub.',
    ...weighedPractice,
  },
  {
    name: 'drive-gear-reused: yes',
    conditions: answer('drive-gear-reused', 'yes'),
    weights: { 'drive-gear-failed': 2.5 },
    group: 'drive',
    note: 'The gear of the compressor before was used again.',
    ...weighedPractice,
  },
  {
    name: 'drive-gear-state: worn-or-chipped',
    conditions: answer('drive-gear-state', 'worn-or-chipped'),
    weights: {
      'drive-gear-failed': 8.9, 'crank-or-bearing-failed': 6, 'oil-feed-restricted': 3, 'normal-carryover': -3,
    },
    group: 'drive',
    note: 'Teeth are worn or chipped.',
    ...judgement,
  },
  {
    name: 'drive-gear-state: rim-loose',
    conditions: answer('drive-gear-state', 'rim-loose'),
    weights: {
      ...others(-2.5), 'drive-gear-failed': 16, 'crank-or-bearing-failed': 6.5, 'oil-feed-restricted': 2,
      'normal-carryover': -8,
    },
    group: 'drive',
    note: 'The rim has let go of its hub: the crank is no longer driven.',
    ...judgement,
  },
  {
    name: 'bearing-state: sound',
    conditions: answer('bearing-state', 'sound'),
    weights: { 'crank-or-bearing-failed': -14.5 },
    group: 'feed-and-bearings',
    note: 'Crank, rod and bearings are sound: they have had their oil.',
    ...judgement,
  },
  {
    name: 'bearing-state: wiped',
    conditions: answer('bearing-state', 'wiped'),
    weights: {
      ...others(-1.5, { except: ['crank-or-bearing-failed'] }), 'oil-feed-restricted': 9, 'oil-degraded': 5,
      'rings-worn': 2, 'normal-carryover': -4.5,
    },
    group: 'feed-and-bearings',
    note: 'Dry or wiped bearings: oil has been starved or thin.',
    ...judgement,
  },
  {
    name: 'bearing-state: broken-or-seized',
    conditions: answer('bearing-state', 'broken-or-seized'),
    weights: {
      ...others(-3.5), 'crank-or-bearing-failed': 15, 'oil-feed-restricted': 10.5, 'oil-degraded': 1,
      'rings-worn': -3.5, 'normal-carryover': -13.5,
    },
    group: 'feed-and-bearings',
    note: 'Crank, rod or bearing has broken or seized.',
    ...judgement,
  },
];
