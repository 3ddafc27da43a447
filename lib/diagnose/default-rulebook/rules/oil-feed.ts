import { judgement, weighedMemory } from '../basis';
import { miles, psi } from '../si';
import type { Rule } from '../../types';
import { answer, band, others } from './rule';

export const rules: Rule[] = [
  {
    name: 'feed-line-state: kinked',
    conditions: answer('feed-line-state', 'kinked'),
    weights: {
      ...others(-2, { except: ['oil-degraded'] }), 'oil-feed-restricted': 12.4, 'crank-or-bearing-failed': 8,
      'rings-worn': -4, 'normal-carryover': -5,
    },
    group: 'feed-and-bearings',
    note: 'The feed line is kinked or collapsed: the bearings starve.',
    ...judgement,
  },
  {
    name: 'feed-line-state: sludged-or-covered',
    conditions: answer('feed-line-state', 'sludged-or-covered'),
    weights: {
      ...others(-1.5), 'oil-feed-restricted': 10.5, 'crank-or-bearing-failed': 7, 'oil-degraded': 6,
      'rings-worn': -3, 'normal-carryover': -4,
    },
    group: 'feed-and-bearings',
    note: 'The feed is sludged or its port covered: the bearings starve.',
    ...judgement,
  },
  {
    name: 'oil-pressure-at-feed: starved',
    conditions: band('oil-pressure-at-feed', { below: psi(8) }),
    weights: {
      ...others(-3.5), 'oil-feed-restricted': 13.5, 'crank-or-bearing-failed': 10, 'oil-degraded': 3,
      'rings-worn': -6.5, 'dryer-overdue': -6.5, 'normal-carryover': -9,
    },
    group: 'feed-and-bearings',
    note: 'Hardly any oil pressure reaches the bearings at idle.',
    ...weighedMemory,
  },
  {
    name: 'oil-pressure-at-feed: low',
    conditions: band('oil-pressure-at-feed', { from: psi(8), below: psi(15) }),
    weights: {
      'crank-or-bearing-failed': 6.5, 'oil-degraded': 5.5, 'dryer-overdue': -1, 'rings-worn': -1.5,
      'normal-carryover': -2,
    },
    group: 'feed-and-bearings',
    note: 'Oil pressure at the feed is under the 15 psi that bearings need.',
    ...weighedMemory,
  },
  {
    name: 'oil-pressure-at-feed: enough',
    conditions: band('oil-pressure-at-feed', { from: psi(15) }),
    weights: { 'oil-feed-restricted': -11 },
    group: 'feed-and-bearings',
    note: 'The bearings get their oil pressure.',
    ...weighedMemory,
  },
  {
    name: 'oil-service-age: under-15000',
    conditions: band('oil-service-age', { below: miles(15_000) }),
    weights: { 'discharge-line-carboned': -0.5, 'oil-degraded': -8.4 },
    group: 'oil-quality',
    note: 'The engine oil is fresh.',
    ...judgement,
  },
  {
    name: 'oil-service-age: 15000-to-30000',
    conditions: band('oil-service-age', { from: miles(15_000), below: miles(30_000) }),
    weights: { 'engine-oil-overfull': -5 },
    group: 'oil-quality',
    note: 'The engine oil is within an ordinary interval.',
    ...judgement,
  },
  {
    name: 'oil-service-age: 30000-to-50000',
    conditions: band('oil-service-age', { from: miles(30_000), below: miles(50_000) }),
    weights: {
      'oil-degraded': 3.2, 'discharge-line-carboned': 1, 'normal-carryover': -1, 'engine-oil-overfull': -4.5,
    },
    group: 'oil-quality',
    note: 'The engine oil is old: thin or sooty oil passes the rings and bakes early.',
    ...judgement,
  },
  {
    name: 'oil-service-age: over-50000',
    conditions: band('oil-service-age', { from: miles(50_000) }),
    weights: {
      ...others(-1), 'oil-degraded': 9.7, 'crankcase-pressure-high': 1, 'discharge-line-carboned': 1,
      'engine-oil-overfull': -4, 'normal-carryover': -4,
    },
    group: 'oil-quality',
    note: 'The engine oil is long overdue: it passes the rings and bakes early.',
    ...judgement,
  },
  {
    name: 'engine-oil-condition: normal',
    conditions: answer('engine-oil-condition', 'normal'),
    weights: { 'oil-degraded': -10.1 },
    group: 'oil-quality',
    note: 'The engine oil is in order.',
    ...judgement,
  },
  {
    name: 'engine-oil-condition: fuel',
    conditions: answer('engine-oil-condition', 'fuel'),
    weights: {
      ...others(-1.5), 'oil-degraded': 9.7, 'engine-oil-overfull': 6.5, 'crankcase-pressure-high': 1,
      'discharge-line-carboned': 0.5, 'head-gasket-failed': -2, 'dryer-overdue': -2, 'rings-worn': -2.5,
      'normal-carryover': -3.5,
    },
    group: 'oil-quality',
    note: 'Fuel has thinned the engine oil.',
    ...judgement,
  },
  {
    name: 'engine-oil-condition: sooty',
    conditions: answer('engine-oil-condition', 'sooty'),
    weights: {
      'oil-degraded': 5.7, 'crankcase-pressure-high': 3, 'discharge-line-carboned': 1.5, 'rings-worn': -1,
      'head-gasket-failed': -1, 'dryer-overdue': -1, 'normal-carryover': -1.5, 'engine-oil-overfull': -5,
    },
    group: 'oil-quality',
    note: 'The engine oil is thick with soot: it bakes to carbon early.',
    ...judgement,
  },
  {
    name: 'engine-oil-condition: milky',
    conditions: answer('engine-oil-condition', 'milky'),
    weights: {
      ...others(-1.5, { except: ['oil-degraded', 'discharge-line-carboned'] }), 'engine-oil-overfull': 8,
      'head-gasket-failed': 8, 'crankcase-pressure-high': -1.5, 'dryer-overdue': -3, 'rings-worn': -4,
      'normal-carryover': -6,
    },
    group: 'oil-quality',
    note: 'There is coolant in the engine oil.',
    ...judgement,
  },
];
