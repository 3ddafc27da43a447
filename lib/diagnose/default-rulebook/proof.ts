import type { Proof, WatchPlan, WatchReading } from '../types';
import { commonPractice } from './basis';
import { days, miles, minutes, psi } from './si';

const WEEKLY = days(7);
const FORTNIGHTLY = days(14);
const MONTHLY = days(28);

/** Oil at the end of the path is what every repair is about. */
const oil: WatchReading[] = [
  { check: 'oil-amount', inOrder: ['film'], every: WEEKLY, everyDistance: miles(2000) },
  { check: 'oil-caught', inOrder: ['very-little', 'some'], every: FORTNIGHTLY },
];

const plan = (given: Omit<WatchPlan, 'basis' | 'source' | 'duration' | 'distance'> & Partial<Pick<WatchPlan, 'duration'>>): WatchPlan => ({
  duration: MONTHLY,
  distance: miles(3000),
  basis: 'judgement',
  source: 'What is read: common practice, no source. How often and how long: judgement.',
  ...given,
});

/** How a repair is proved. Intervals and spans are judgement; what is measured and why stands in `docs/default-rulebook.md`. */
export const proof: Proof = {
  fitting: {
    cautions: ['vehicle-rolls', 'cab-not-propped', 'pressure-falls-suspension-brakes', 'stored-air', 'hot-parts', 'scalding-coolant', 'heavy-part', 'belts-fan-gears', 'carbon-fire', 'safety-valve', 'oil-in-brake-system'],
  },
  breakIn: {
    engineRpm: 1000,
    pressure: { aim: psi(80), low: psi(75), high: psi(85) },
    duration: { least: minutes(20), most: minutes(30) },
    cautions: ['vehicle-rolls', 'exhaust-fumes', 'oil-mist-and-noise', 'belts-fan-gears', 'hot-parts', 'safety-valve'],
    ...commonPractice,
  },
  release: {
    checks: [
      { check: 'build-up-time', inOrder: ['quick', 'slow'] },
      { check: 'cut-out-pressure', inOrder: ['in-range'] },
      { check: 'cut-in-pressure', inOrder: ['in-range'] },
      { check: 'leak-down-released', inOrder: ['under-2'] },
      { check: 'leak-down-applied', inOrder: ['under-3'] },
      { check: 'low-air-warning', inOrder: ['in-time'] },
    ],
    oilDownstream: {
      when: [
        { check: 'oil-in-service-tanks', states: ['yes'] },
        { check: 'oil-at-valves', states: ['yes'] },
      ],
      checks: [{ check: 'brake-function', inOrder: ['works'] }],
    },
  },
  watch: {
    begin: [
      'The discharge line is new, or it was cleaned and its bore measured.',
      'Every tank was drained until only dry air came.',
      'The dryer cartridge is new.',
      'The first weighing is zero: the bottle is clean, and so is a card held to the purge.',
    ],
    plans: [
      plan({ id: 'oil', name: 'Oil at the dryer', causes: [], readings: oil }),
      plan({
        id: 'air-leaves',
        name: 'Oil, and heat at the head',
        causes: ['discharge-line-carboned', 'discharge-line-kinked-or-frozen', 'dryer-restricted', 'valve-leaking'],
        readings: [...oil, { check: 'head-temperature', inOrder: ['at-baseline'], every: FORTNIGHTLY }, { check: 'build-up-time', inOrder: ['quick'], every: FORTNIGHTLY }],
      }),
      plan({
        id: 'rest',
        name: 'Oil, leaks and time loaded',
        causes: ['system-leaks', 'demand-too-high', 'purge-or-check-valve-leaking'],
        readings: [...oil, { check: 'leak-down-released', inOrder: ['under-2'], every: FORTNIGHTLY }, { check: 'share-loaded', inOrder: ['under-25'], every: FORTNIGHTLY }],
      }),
      plan({
        id: 'regulation',
        name: 'Oil, cut-out and cut-in',
        causes: ['governor-faulty', 'unloader-stuck'],
        readings: [...oil, { check: 'cut-out-pressure', inOrder: ['in-range'], every: FORTNIGHTLY }, { check: 'cut-in-pressure', inOrder: ['in-range'], every: FORTNIGHTLY }],
      }),
      plan({
        id: 'coolant',
        name: 'Oil and coolant',
        causes: ['head-gasket-failed', 'coolant-starved'],
        readings: [...oil, { check: 'coolant-level-falling', inOrder: ['no'], every: WEEKLY }, { check: 'coolant-in-wet-tank', inOrder: ['no'], every: WEEKLY }],
      }),
      plan({
        id: 'intake',
        name: 'Oil and intake vacuum',
        causes: ['intake-filter-clogged', 'intake-hose-collapsed', 'intake-dirt-ingested', 'oil-in-intake-air'],
        readings: [...oil, { check: 'intake-vacuum', inOrder: ['open'], every: FORTNIGHTLY }],
      }),
      plan({
        id: 'engine-oil',
        name: 'Oil, and the level in the engine',
        causes: ['engine-oil-overfull', 'oil-degraded', 'crankcase-pressure-high'],
        readings: [...oil, { check: 'engine-oil-level', inOrder: ['in-range'], every: WEEKLY }],
      }),
      plan({
        id: 'feed-and-drive',
        name: 'Oil, feed pressure and noise',
        causes: ['oil-feed-restricted', 'crank-or-bearing-failed', 'drive-gear-failed'],
        readings: [...oil, { check: 'oil-pressure-at-feed', inOrder: ['enough'], every: FORTNIGHTLY }, { check: 'noise', inOrder: ['ordinary'], every: WEEKLY }],
      }),
      plan({
        id: 'nothing-repaired',
        name: 'Oil, for longer',
        causes: ['normal-carryover', 'dryer-overdue'],
        readings: [{ check: 'oil-caught', inOrder: ['very-little', 'some'], every: FORTNIGHTLY }, { check: 'oil-amount', inOrder: ['film', 'light'], every: FORTNIGHTLY }],
        duration: days(56),
      }),
    ],
  },
};
