import { everAtRisk, requireSpells, type Spell } from './spell';

/** An age at which spells ended. */
export interface RiskRow {
  readonly age: number;
  /** Spells with entry < age <= exit. */
  readonly atRisk: number;
  readonly failed: number;
  /** Left at this age without failing: after its failures. */
  readonly censored: number;
}

/**
 * How many were at risk and failed at each age at which a spell ended, in order. O(n log n).
 *
 * @throws RangeError for illegal spells
 * @example riskTable([{ exitAge: 5, failed: true }, { exitAge: 9, failed: false }])[0]
 * // { age: 5, atRisk: 2, failed: 1, censored: 0 }
 */
export function riskTable(spells: readonly Spell[]): RiskRow[] {
  requireSpells(spells);
  const watched = spells.filter(everAtRisk);
  // Watched from new means at risk at age 0 as well: before every other entry.
  const entries = Float64Array.from(watched, ({ entryAge = 0 }) => (entryAge === 0 ? -1 : entryAge)).sort();
  const exits = watched.toSorted((a, b) => a.exitAge - b.exitAge);
  const rows: RiskRow[] = [];
  let entered = 0;
  let left = 0;
  while (left < exits.length) {
    const age = exits[left]?.exitAge ?? 0;
    while (entered < entries.length && (entries[entered] ?? Infinity) < age) entered += 1;
    const atRisk = entered - left;
    let failed = 0;
    let censored = 0;
    for (; exits[left]?.exitAge === age; left += 1) {
      if (exits[left]?.failed) failed += 1;
      else censored += 1;
    }
    rows.push({ age, atRisk, failed, censored });
  }
  return rows;
}

/** The last row at or before an age, by halving. */
export function rowAt<Row extends { readonly age: number }>(rows: readonly Row[], age: number): Row | undefined {
  let [low, high] = [0, rows.length];
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((rows[middle]?.age ?? Infinity) <= age) low = middle + 1;
    else high = middle;
  }
  return rows[low - 1];
}
