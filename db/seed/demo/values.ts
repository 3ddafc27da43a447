import type { CompiledCheck } from '@/lib/diagnose';
import { measureOf } from '@/lib/services/case/view/measure';
import { formatQuantity, formatValue } from '@/lib/units';
import { WRITING } from './organisation';
import type { Random } from './random';

/** How far an end band without an end of its own is taken to reach: past its only edge by this part of it. */
const REACHES = 0.6;
/** The same for temperatures, whose zero means nothing, K. */
const REACHES_K = 14;

/** A value within a band of a measured check, SI. */
export function valueWithin(check: CompiledCheck, state: string, random: Random): number {
  const { states, range, quantity } = check.check;
  const band = states.find(({ id }) => id === state);
  if (quantity === 'count') return Math.ceil(band?.low ?? 0);
  const { min = -Infinity, max = Infinity } = range ?? {};
  const reach = (edge: number) => (quantity === 'temperature' ? REACHES_K : Math.abs(edge) * REACHES);
  const high = band?.high ?? Math.min(max, (band?.low ?? 0) + reach(band?.low ?? 0));
  const low = band?.low ?? Math.max(min < 0 ? 0 : min, high - 2 * reach(high));
  // A little off the edges, so that rounding what is typed doesn't carry it over.
  return random.between(low + 0.04 * (high - low), high - 0.04 * (high - low));
}

/** What people type: mostly the figure alone, now and then with its unit, seldom with an error. */
export function typedValue(check: CompiledCheck, si: number, random: Random): { value: string; error?: string } {
  const measure = measureOf(check.check, WRITING.person.units);
  if (!measure) throw new Error(`${check.id} is not measured`);
  const { quantity, unit, difference, differenceUnit } = measure;
  const shown = random.chance(0.3) ? formatQuantity(si, { quantity, unit }) : formatValue(si, { quantity, unit });
  const { usualError = 0 } = check.check;
  const error = usualError > 0 && random.chance(0.15) ? formatValue(usualError * random.pick([0.5, 1, 1.5, 2]), { quantity: difference, unit: differenceUnit }) : undefined;
  return error === undefined ? { value: shown } : { value: shown, error };
}
