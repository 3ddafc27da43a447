import type { CompiledCheck } from '@/lib/diagnose';
import { measureOf } from '@/lib/case/view/measure';
import { formatQuantity, formatValue, type UnitId } from '@/lib/units';
import { WRITING } from './organisation';
import type { Random } from './random';

/** How far a last band without an end is taken to reach, past its edge, as part of it. */
const REACHES = 0.6;
/** Where a first band without a beginning is taken to begin, as part of its edge: nothing builds up in no time. */
const BEGINS = 0.4;
/** Differences begin near nothing. */
const BEGINS_NEAR_NOTHING = 0.05;

/** Decimals that people read off an instrument and type, by unit; three figures where none is given. */
const DECIMALS: Partial<Record<UnitId, number>> = {
  psi: 0, 'psi/min': 1, inH2O: 1, degF: 0, in: 2, floz: 1, 'mL/h': 2, s: 0, yr: 1, h: 0, 'per h': 0, percent: 0, one: 0,
};

/** A value within a band of a measured check, SI. */
export function valueWithin(check: CompiledCheck, state: string, random: Random): number {
  const { states, range, quantity } = check.check;
  const band = states.find(({ id }) => id === state);
  if (quantity === 'count') return Math.ceil(band?.low ?? 0);
  const { min = -Infinity, max = Infinity } = range ?? {};
  const high = band?.high ?? Math.min(max, (1 + REACHES) * (band?.low ?? 0));
  const low = band?.low ?? Math.max(min, (min < 0 ? BEGINS_NEAR_NOTHING : BEGINS) * high);
  // A little off the edges, so that rounding what is typed doesn't carry it over.
  return random.between(low + 0.04 * (high - low), high - 0.04 * (high - low));
}

/** What people type: mostly the figure alone, now and then with its unit, seldom with an error. */
export function typedValue(check: CompiledCheck, si: number, random: Random): { value: string; error?: string } {
  const measure = measureOf(check.check, WRITING.person.units);
  if (!measure) throw new Error(`${check.id} is not measured`);
  const { quantity, unit, difference, differenceUnit } = measure;
  const digits = DECIMALS[unit];
  const figures = digits === undefined ? { significant: 3 } : { digits };
  const shown = random.chance(0.3) ? formatQuantity(si, { quantity, unit, ...figures }) : formatValue(si, { quantity, unit, ...figures });
  const { usualError = 0 } = check.check;
  const error = usualError > 0 && random.chance(0.15) ? formatValue(usualError * random.pick([0.5, 1, 1.5, 2]), { quantity: difference, unit: differenceUnit }) : undefined;
  return error === undefined ? { value: shown } : { value: shown, error };
}
