/** What it takes to bring the vehicle from where it stands to where a check can be made. */
import type { Access, SetUp, SetUpMinutes } from './types';

/** Where the vehicle stands. A dimension that is left out isn't known, so a check that needs it pays for it. */
export interface VehicleState {
  engine?: 'off' | 'idle' | 'governed';
  air?: 'full' | 'empty';
  heat?: 'hot' | 'cold';
  brakes?: 'released' | 'applied';
  access: readonly Access[];
}

/** A vehicle as it is handed in: parked, brakes applied, nothing opened. Air and heat depend on how long ago. */
export const AS_PARKED: VehicleState = { engine: 'off', brakes: 'applied', access: [] };

/**
 * Minutes to go from where the vehicle stands to a check's set-up. Dimensions that the check doesn't name cost
 * nothing; what is there already costs nothing.
 *
 * @param from where it stands
 * @param to what the check needs
 * @param minutes the rulebook's `settings.setUpMinutes`
 * @returns minutes, 0 or more
 * @example minutesToGo(AS_PARKED, { engine: 'idle' }, minutes); // minutes.engine.idle
 */
export function minutesToGo(from: VehicleState, to: SetUp, minutes: SetUpMinutes): number {
  let total = 0;
  if (to.engine && to.engine !== from.engine) total += minutes.engine[to.engine];
  if (to.air && to.air !== from.air) total += minutes.air[to.air];
  if (to.heat && to.heat !== from.heat) total += minutes.heat[to.heat];
  if (to.brakes && to.brakes !== from.brakes) total += minutes.brakes[to.brakes];
  for (const access of to.access ?? []) if (!from.access.includes(access)) total += minutes.access[access];
  return total;
}

/**
 * Where the vehicle stands once a check's set-up has been made. What the check doesn't name stays; what has been
 * opened stays open.
 *
 * @example stateAfter(AS_PARKED, { engine: 'idle' }).engine; // 'idle'
 */
export function stateAfter(from: VehicleState, setUp: SetUp): VehicleState {
  const { access = [], ...named } = setUp;
  return { ...from, ...named, access: [...new Set([...from.access, ...access])] };
}
