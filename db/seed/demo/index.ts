import { compileRulebook } from '@/lib/diagnose';
import type { Rulebook } from '@/lib/diagnose/types';
import { seededId } from '../seeded-id';
import { calendarTo, type Calendar } from './calendar';
import type { World } from './world';
import { limitRows } from './limit-rows';
import { catchRows } from './catch-rows';
import { noticeRows } from './notice-rows';
import { modelRows } from './model-rows';
import { policyOf } from './policy';
import { randomFrom } from './random';
import { noRows, type DemoRows } from './rows';
import { Truth, type TrueCause } from './truth';
import { watchRows } from './watch-rows';
import { UnitStory } from './unit-story';
import { compareFindings } from './compare-findings';
import { makeVehicles, type Vehicle } from './vehicles';

export interface Demo {
  rows: DemoRows;
  /** By case: what was really wrong. Not for the database. */
  truths: ReadonlyMap<string, readonly TrueCause[]>;
}

export const EDITION_ID = seededId('edition 1');

/**
 * Three years of an invented fleet, up to the day before `today`: the same rows, to the last byte, for the same day and
 * rulebook. What was put in to be found is told in docs/demo-data.md.
 *
 * @param today its start, UTC
 * @param rulebook the organisation's edition 1
 * @param vehicles whose story is told: each is told alike whichever others there are
 */
export function makeDemo(today: Date, rulebook: Rulebook, vehicles: readonly Vehicle[] = makeVehicles()): Demo {
  const rows = noRows();
  const calendar = calendarTo(today);
  const compiled = compileRulebook(rulebook);
  const world: World = { compiled, editionId: EDITION_ID, calendar, rows, truths: new Map() };
  const shop = { compiled, truth: new Truth(compiled), policy: policyOf(compiled) };
  const random = randomFrom('demo');
  modelRows(rows, beganOn(calendar), random.fork('models'));
  limitRows(rows, beganOn(calendar), random.fork('limits'));
  for (const vehicle of vehicles) new UnitStory(world, shop, vehicle, random.fork(vehicle.fleetNumber)).tell();
  compareFindings(rows, compiled);
  catchRows(rows, compiled, random.fork('catches'));
  watchRows(rows, rulebook, today, random.fork('watches'));
  noticeRows(rows);
  numberCases(rows);
  return { rows, truths: world.truths };
}

/** The instant at which the organisation's record begins. */
export const beganOn = (calendar: Calendar): Date => calendar.at(0, 0, 'UTC');

/** Cases are counted in the order in which they were opened. */
function numberCases(rows: DemoRows): void {
  rows.cases.sort((a, b) => a.openedAt.getTime() - b.openedAt.getTime() || (a.id < b.id ? -1 : 1));
  const numbers = new Map(rows.cases.map((row, i) => [row.id, i + 1]));
  for (const row of rows.cases) row.number = numbers.get(row.id) ?? 0;
  for (const { action, entity, entityId, changed } of rows.audit) if (action === 'open.case' && entity === 'case') changed.number = numbers.get(entityId);
}
