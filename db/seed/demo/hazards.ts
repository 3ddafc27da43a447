import { NORMAL_CARRYOVER, SOMETHING_ELSE, type Cause } from '@/lib/diagnose';
import { DAYS_OF_RECORD } from './calendar';
import type { DemoModel } from './compressor-models';
import type { Practice } from './practice';
import type { Vehicle } from './vehicles';

/** Cases a year of an ordinary unit, before what early fates and comebacks add. */
const CASES_A_YEAR = 1.1;
/** Share of cases that no listed cause explains. */
export const UNLISTED_SHARE = 0.06;
/** A campaign in the last weeks looks at every air system, so that more is found. */
const CAMPAIGN_DAYS = 28;
const CAMPAIGN = 1.7;

/** What the rate of each cause hangs on, on a day. */
export interface Condition {
  vehicle: Vehicle;
  model: DemoModel;
  practice: Practice;
  /** Run since the fit. Where a vehicle idles, hours count for more: 40 miles each. */
  miles: number;
  /** Run since the discharge line was new. */
  lineMiles: number;
  cartridgeYears: number;
  /** 0 in January. */
  month: number;
}

/** How much commoner or rarer a cause is than its prior, by the condition of unit and fit. */
const TIMES: Record<string, (c: Condition) => number> = {
  'rings-worn': ({ miles }) => Math.min(5, 0.12 + (miles / 260_000) ** 2),
  'valve-leaking': ({ miles }) => 0.5 + miles / 300_000,
  'crank-or-bearing-failed': ({ miles }) => 0.5 + miles / 300_000,
  'unloader-stuck': ({ miles }) => 0.6 + miles / 400_000,
  // What these two have more of comes soon after a fit (see practice.ts).
  'drain-choked-by-sealant': () => 0.03,
  'rings-not-seated': () => 0.05,
  'discharge-line-carboned': ({ lineMiles, practice }) => (practice.dischargeLine === 'kept' ? 0.4 : 0.1) + lineMiles / 1_000_000,
  'dryer-overdue': ({ cartridgeYears }) => 0.2 + 0.5 * Math.min(4, cartridgeYears),
  [NORMAL_CARRYOVER]: ({ cartridgeYears }) => 0.5 + 0.3 * Math.min(4, cartridgeYears),
  'system-leaks': ({ vehicle }) => ({ 'long-haul': 0.5, regional: 0.8, 'stop-start': 2, 'air-for-unloading': 1.6 })[vehicle.vocation],
  'demand-too-high': ({ vehicle }) => ({ 'long-haul': 0.1, regional: 0.5, 'stop-start': 1.6, 'air-for-unloading': 5 })[vehicle.vocation],
  'governor-faulty': ({ practice }) => (practice.governor === 'changed' ? 0.6 : 1.3),
  'intake-hose-collapsed': ({ practice }) => (practice.intakeHose === 'changed' ? 0.6 : 1.3),
  'intake-filter-clogged': ({ model }) => (model.intakeType === 'naturally-aspirated' ? 2 : 0.1),
  'oil-in-intake-air': ({ model }) => (model.intakeType === 'boosted' ? 1.5 : 0.3),
  'oil-feed-restricted': ({ practice, model }) => (practice.feedLine === 'changed' ? 0.5 : 1.3) * (model.oilFeedPlace === 'through-drive' ? 0.4 : 1.2),
  'drive-gear-failed': ({ practice, model }) => (model.driveGear === 'steel' ? 0.5 : practice.driveGear === 'kept' ? 8 : 2),
  'coolant-starved': ({ model }) => (model.cooling === 'coolant' ? 1.1 : 0.2),
  'discharge-line-kinked-or-frozen': ({ month }) => (month <= 1 || month === 11 ? 3 : 0.3),
};

/**
 * Cases a day of each listed cause, and of what is unlisted, which stands under "something else".
 *
 * @param causes of the rulebook: a prior is taken for the rate of an ordinary unit
 * @returns in the order of `causes`
 */
export function ratesOn(day: number, condition: Condition, causes: readonly Cause[]): Float64Array {
  const learning = 0.85 + (0.3 * day) / DAYS_OF_RECORD;
  const campaign = day >= DAYS_OF_RECORD - CAMPAIGN_DAYS ? CAMPAIGN : 1;
  const base = (CASES_A_YEAR / 365) * condition.vehicle.frailty * learning * campaign;
  return Float64Array.from(causes, ({ id, prior }) => base * (id === SOMETHING_ELSE ? UNLISTED_SHARE : prior) * (TIMES[id]?.(condition) ?? 1));
}
