import { judgement, weighedCutIn, weighedManual, weighedPractice } from '../basis';
import { psi } from '../si';
import type { Rule } from '../../types';
import { answer, band, others } from './rule';

export const rules: Rule[] = [
  {
    name: 'cut-out-pressure: low',
    conditions: band('cut-out-pressure', { below: psi(120) }),
    weights: {
      ...others(-2), 'drive-gear-failed': 7.5, 'governor-faulty': 5.5, 'crank-or-bearing-failed': 5,
      'discharge-line-kinked-or-frozen': 3.5, 'valve-leaking': 2.5, 'system-leaks': 2.5, 'demand-too-high': 2.5,
      'purge-or-check-valve-leaking': 1, 'discharge-line-carboned': 0.5, 'unloader-stuck': -1,
      'dryer-overdue': -2.5, 'rings-worn': -3.5, 'normal-carryover': -4.5,
    },
    group: 'governor',
    note: 'It cuts out too early, or never gets that far.',
    ...weighedManual,
  },
  {
    name: 'cut-out-pressure: high',
    conditions: band('cut-out-pressure', { from: psi(141) }),
    weights: {
      ...others(-2), 'governor-faulty': 9.5, 'unloader-stuck': 7.5, 'discharge-line-carboned': -0.5,
      'purge-or-check-valve-leaking': -0.5, 'valve-leaking': -2.5, 'discharge-line-kinked-or-frozen': -2.5,
      'system-leaks': -2.5, 'demand-too-high': -2.5, 'crank-or-bearing-failed': -2.5, 'dryer-overdue': -3.5,
      'rings-worn': -4.5, 'drive-gear-failed': -5.5, 'normal-carryover': -6.5,
    },
    group: 'governor',
    note: 'It cuts out too late: the compressor works against more than it should.',
    ...weighedManual,
  },
  {
    name: 'cut-in-pressure: under-85',
    conditions: band('cut-in-pressure', { below: psi(85) }),
    weights: {
      ...others(-0.5), 'governor-faulty': 9, 'unloader-stuck': 2.5, 'dryer-overdue': -2.5, 'rings-worn': -3.5,
      'normal-carryover': -5.5,
    },
    group: 'governor',
    note: 'It cuts in far too late, or the governor sticks.',
    ...weighedCutIn,
  },
  {
    name: 'cut-in-pressure: 85-to-100',
    conditions: band('cut-in-pressure', { from: psi(85), below: psi(100) }),
    weights: { 'governor-faulty': 3.5, 'unloader-stuck': 1, 'rings-worn': -1, 'normal-carryover': -1.5 },
    group: 'governor',
    note: 'It cuts in below 100 psi: late for a truck, in order for a bus.',
    ...weighedCutIn,
  },
  {
    name: 'governor-span: narrow',
    conditions: band('governor-span', { below: psi(15) }),
    weights: {
      ...others(-1.5), 'governor-faulty': 10.5, 'purge-or-check-valve-leaking': 3, 'unloader-stuck': 2,
      'dryer-overdue': -3, 'rings-worn': -4, 'normal-carryover': -6,
    },
    group: 'governor',
    note: 'Cut-in and cut-out lie too close: it loads and unloads all day.',
    ...weighedPractice,
  },
  {
    name: 'governor-span: wide',
    conditions: band('governor-span', { from: psi(36) }),
    weights: {
      ...others(-1), 'governor-faulty': 8.5, 'unloader-stuck': 3, 'purge-or-check-valve-leaking': -0.5,
      'dryer-overdue': -2, 'rings-worn': -2.5, 'normal-carryover': -3.5,
    },
    group: 'governor',
    note: 'Cut-in and cut-out lie too far apart: the governor sticks.',
    ...weighedPractice,
  },
  {
    name: 'unloads-at-cut-out: keeps-pumping',
    conditions: answer('unloads-at-cut-out', 'keeps-pumping'),
    weights: {
      ...others(-3), 'unloader-stuck': 9.2, 'governor-faulty': 8, 'valve-leaking': 3.5, 'system-leaks': 2,
      'purge-or-check-valve-leaking': 1.5, 'crank-or-bearing-failed': -2, 'dryer-overdue': -4.5, 'rings-worn': -6.5,
      'drive-gear-failed': -9, 'normal-carryover': -10,
    },
    group: 'governor',
    note: 'It keeps pumping at cut-out: governor or unloader doesn’t let it rest.',
    ...judgement,
  },
  {
    name: 'unloads-at-cut-out: never-loads',
    conditions: answer('unloads-at-cut-out', 'never-loads'),
    weights: {
      ...others(-6), 'drive-gear-failed': 12.5, 'crank-or-bearing-failed': 11, 'unloader-stuck': 9.4,
      'governor-faulty': 7.5, 'valve-leaking': -4.5, 'purge-or-check-valve-leaking': -4.5, 'system-leaks': -4.5,
      'rings-worn': -9, 'dryer-overdue': -10, 'normal-carryover': -11.5,
    },
    group: 'governor',
    note: 'It never loads: the unloader is stuck, or nothing is driven.',
    ...judgement,
  },
  {
    name: 'governor-signal: wrong',
    conditions: answer('governor-signal', 'wrong'),
    weights: {
      ...others(-2.5), 'governor-faulty': 12, 'unloader-stuck': 2, 'dryer-overdue': -4, 'rings-worn': -5,
      'normal-carryover': -7,
    },
    group: 'governor',
    note: 'The governor’s signal is wrong.',
    ...judgement,
  },
  {
    name: 'wet-tank-safety-valve: yes',
    conditions: answer('wet-tank-safety-valve', 'yes'),
    weights: { ...others(-4.5), 'governor-faulty': 10.5, 'unloader-stuck': 10, 'normal-carryover': -9 },
    group: 'governor',
    note: 'The wet tank’s safety valve has lifted: nothing stopped the compressor in time.',
    ...weighedManual,
  },
  {
    name: 'unloader-o-rings: worn',
    conditions: answer('unloader-o-rings', 'worn'),
    weights: {
      ...others(-0.5, { except: ['governor-faulty'] }), 'unloader-stuck': 7.3, 'valve-leaking': 1.5,
      'rings-worn': 1, 'dryer-overdue': -2.5, 'normal-carryover': -4, 'rings-not-seated': -6,
    },
    group: 'governor',
    note: 'The unloader’s O-rings or pistons are worn, torn or stuck.',
    ...judgement,
  },
];
