import { judgement, weighedPractice } from '../basis';
import { mm, psi } from '../si';
import type { Rule } from '../../types';
import { answer, band, others } from './rule';

export const rules: Rule[] = [
  {
    name: 'discharge-line-look: kinked',
    conditions: answer('discharge-line-look', 'kinked'),
    weights: {
      ...others(-1), 'discharge-line-kinked-or-frozen': 10, 'discharge-line-carboned': 2, 'dryer-overdue': -2.5,
      'rings-worn': -3, 'normal-carryover': -4,
    },
    group: 'restriction',
    note: 'The line is kinked: it holds the air back.',
    ...judgement,
  },
  {
    name: 'discharge-line-look: low-spot',
    conditions: answer('discharge-line-look', 'low-spot'),
    weights: {
      ...others(-0.5), 'discharge-line-kinked-or-frozen': 6.5, 'discharge-line-carboned': 3, 'dryer-overdue': -1,
      'rings-worn': -1.5, 'normal-carryover': -1.5,
    },
    group: 'restriction',
    note: 'The line has a low spot where oil bakes and water freezes.',
    ...judgement,
  },
  {
    name: 'discharge-line-look: wrong-fitting',
    conditions: answer('discharge-line-look', 'wrong-fitting'),
    weights: {
      'discharge-line-kinked-or-frozen': 7, 'discharge-line-carboned': 1.5, 'dryer-overdue': -1.5, 'rings-worn': -2,
      'normal-carryover': -2.5,
    },
    group: 'restriction',
    note: 'A wrong or narrow fitting holds the air back.',
    ...judgement,
  },
  {
    name: 'line-frees-when-warmed: yes',
    conditions: answer('line-frees-when-warmed', 'yes'),
    weights: {
      ...others(-2), 'discharge-line-kinked-or-frozen': 12, 'dryer-restricted': 4.5, 'normal-carryover': -6.5,
    },
    group: 'restriction',
    note: 'Air came back when the line was warmed: ice had closed it.',
    ...judgement,
  },
  {
    name: 'line-temperature: sharp-step',
    conditions: answer('line-temperature', 'sharp-step'),
    weights: {
      ...others(-3.5, { except: ['dryer-restricted'] }), 'discharge-line-kinked-or-frozen': 8,
      'discharge-line-carboned': 7.5, 'dryer-overdue': -4, 'rings-worn': -5.5, 'normal-carryover': -7,
    },
    group: 'restriction',
    note: 'The temperature drops sharply at one place of the line: the air is throttled there.',
    ...judgement,
  },
  {
    name: 'head-to-tank-pressure: small',
    conditions: band('head-to-tank-pressure', { below: psi(5) }),
    weights: {
      'dryer-overdue': 0.5, 'dryer-restricted': -8, 'discharge-line-carboned': -9.5,
      'discharge-line-kinked-or-frozen': -10,
    },
    group: 'restriction',
    note: 'Hardly any pressure is lost between head and tank: line and dryer are open.',
    ...judgement,
  },
  {
    name: 'head-to-tank-pressure: raised',
    conditions: band('head-to-tank-pressure', { from: psi(5), below: psi(15) }),
    weights: {
     
      ...others(-0.5, { except: ['discharge-line-carboned', 'discharge-line-kinked-or-frozen', 'dryer-restricted', 'dryer-overdue'] }),
      'rings-worn': -2.5, 'normal-carryover': -4, 'drive-gear-failed': -7,
    },
    group: 'restriction',
    note: 'The head works against more pressure than the tank holds.',
    ...judgement,
  },
  {
    name: 'head-to-tank-pressure: large',
    conditions: band('head-to-tank-pressure', { from: psi(15) }),
    weights: {
      ...others(-5), 'discharge-line-kinked-or-frozen': 8.5, 'discharge-line-carboned': 7.5,
      'dryer-restricted': 7.5, 'rings-worn': -9.5, 'dryer-overdue': -10, 'drive-gear-failed': -13,
      'normal-carryover': -17,
    },
    group: 'restriction',
    note: 'The head works against far more pressure than the tank holds: line or dryer is closed.',
    ...judgement,
  },
  {
    name: 'carbon-in-line: film',
    conditions: answer('carbon-in-line', 'film'),
    weights: {
     
      ...others(0.5, { except: ['rings-worn', 'rings-not-seated', 'head-gasket-failed', 'coolant-starved', 'discharge-line-kinked-or-frozen', 'dryer-overdue', 'system-leaks', 'demand-too-high', 'normal-carryover'] }),
      'dryer-restricted': -1, 'valve-leaking': -1.5, 'oil-degraded': -2, 'discharge-line-carboned': -14.6,
    },
    group: 'restriction',
    note: 'The line is clean inside.',
    ...weighedPractice,
  },
  {
    name: 'carbon-in-line: soft',
    conditions: answer('carbon-in-line', 'soft'),
    weights: {
      'oil-degraded': 2, 'rings-worn': 2, 'valve-leaking': 2, 'coolant-starved': 2, 'system-leaks': 2,
      'demand-too-high': 2, 'dryer-restricted': 1.5, 'discharge-line-kinked-or-frozen': 1, 'dryer-overdue': -1.5,
      'normal-carryover': -4, 'rings-not-seated': -5,
    },
    group: 'restriction',
    note: 'Soft soot in the line: oil has come this way.',
    ...weighedPractice,
  },
  {
    name: 'carbon-in-line: hard-layers',
    conditions: answer('carbon-in-line', 'hard-layers'),
    weights: {
      ...others(-3.5, { except: ['oil-degraded', 'valve-leaking', 'dryer-restricted'] }),
      'discharge-line-carboned': 7.7, 'coolant-starved': 2.5, 'system-leaks': -1, 'demand-too-high': -1,
      'rings-worn': -1.5, 'head-gasket-failed': -1.5, 'discharge-line-kinked-or-frozen': -1.5,
      'dryer-overdue': -8.5, 'rings-not-seated': -11.5, 'normal-carryover': -15.5,
    },
    group: 'restriction',
    note: 'Layers of baked oil have closed the line.',
    ...weighedPractice,
  },
  {
    name: 'line-bore: under-6',
    conditions: band('line-bore', { below: mm(6) }),
    weights: {
      ...others(-10), 'discharge-line-carboned': 10, 'discharge-line-kinked-or-frozen': 4.5, 'coolant-starved': -2,
      'oil-degraded': -4, 'valve-leaking': -4, 'dryer-restricted': -5, 'system-leaks': -7, 'rings-worn': -13.5,
      'dryer-overdue': -13.8, 'rings-not-seated': -14, 'normal-carryover': -17,
    },
    group: 'restriction',
    note: 'The line is down to a fraction of its bore: it passes air at idle, and holds it back at delivery.',
    ...weighedPractice,
  },
  {
    name: 'line-bore: 6-to-10',
    conditions: band('line-bore', { from: mm(6), below: mm(10) }),
    weights: {
      ...others(-3, { except: ['dryer-restricted', 'system-leaks'] }), 'discharge-line-carboned': 7.5,
      'coolant-starved': 2, 'oil-degraded': 1.5, 'discharge-line-kinked-or-frozen': 1.5, 'valve-leaking': 1,
      'rings-not-seated': -5.5, 'dryer-overdue': -5.7, 'rings-worn': -6, 'normal-carryover': -8.5,
    },
    group: 'restriction',
    note: 'The line has lost much of its bore.',
    ...weighedPractice,
  },
  {
    name: 'line-bore: 10-to-13',
    conditions: band('line-bore', { from: mm(10), below: mm(13) }),
    weights: {
      'oil-degraded': 2.5, 'coolant-starved': 2.5, 'valve-leaking': 2, 'dryer-restricted': 2, 'system-leaks': 2,
      'rings-worn': -1, 'rings-not-seated': -1.5, 'normal-carryover': -1.5,
    },
    group: 'restriction',
    note: 'The line has lost a little of its bore.',
    ...weighedPractice,
  },
  {
    name: 'line-bore: open',
    conditions: band('line-bore', { from: mm(13) }),
    weights: { 'dryer-overdue': 0.6, 'discharge-line-carboned': -14 },
    group: 'restriction',
    note: 'The line has its bore.',
    ...weighedPractice,
  },
  {
    name: 'line-loss-ratio: 2-to-5',
    conditions: band('line-loss-ratio', { from: 2, below: 5 }),
    weights: {
      'coolant-starved': 1, 'dryer-restricted': 1, 'oil-degraded': 1, 'system-leaks': 1, 'valve-leaking': 1,
      'discharge-line-kinked-or-frozen': -0.5, 'normal-carryover': -0.5, 'rings-not-seated': -0.5, 'rings-worn': -0.5,
      'discharge-line-carboned': -1,
    },
    group: 'restriction',
    note: 'The line loses a few times what it lost when clean: little beside what a compressor works against.',
    ...judgement,
  },
  {
    name: 'line-loss-ratio: 5-to-50',
    conditions: band('line-loss-ratio', { from: 5, below: 50 }),
    weights: {
      ...others(-1, { except: ['dryer-restricted', 'system-leaks'] }), 'discharge-line-carboned': 4.5,
      'coolant-starved': 1, 'discharge-line-kinked-or-frozen': 0.5, 'oil-degraded': 0.5, 'valve-leaking': 0.5,
      'dryer-overdue': -1.5, 'rings-not-seated': -1.5, 'rings-worn': -1.5, 'normal-carryover': -2,
    },
    group: 'restriction',
    note: 'The line loses many times what it lost when clean.',
    ...judgement,
  },
  {
    name: 'line-loss-ratio: over-50',
    conditions: band('line-loss-ratio', { from: 50 }),
    weights: {
      ...others(-2), 'discharge-line-carboned': 6.5, 'discharge-line-kinked-or-frozen': 2.5, 'coolant-starved': -1,
      'dryer-restricted': -1.5, 'oil-degraded': -1.5, 'valve-leaking': -1.5, 'normal-carryover': -2.5,
    },
    group: 'restriction',
    note: 'The line holds the air back at delivery, whatever it passes at idle.',
    ...judgement,
  },
];
