import { everAtRisk, requireSpells, type Spell } from '../spells/spell';

/** Spells with a practice and without it, of one stratum: one model, one band of age. */
export interface TwoGroups<S extends Spell = Spell> {
  readonly treated: readonly S[];
  readonly others: readonly S[];
}

/** An age at which some failed: at risk and failed of the treated, and of both together. */
export interface JointRow {
  readonly age: number;
  readonly treatedAtRisk: number;
  readonly atRisk: number;
  readonly treatedFailed: number;
  readonly failed: number;
}

/** How many values of an ordered list are below. */
function countBelow(ordered: Float64Array, value: number): number {
  let [low, high] = [0, ordered.length];
  while (low < high) {
    const middle = (low + high) >>> 1;
    if ((ordered[middle] ?? Infinity) < value) low = middle + 1;
    else high = middle;
  }
  return low;
}

function counter(spells: readonly Spell[]) {
  requireSpells(spells);
  const watched = spells.filter(everAtRisk);
  const entries = Float64Array.from(watched, ({ entryAge = 0 }) => (entryAge === 0 ? -1 : entryAge)).sort();
  const exits = Float64Array.from(watched, ({ exitAge }) => exitAge).sort();
  const failures = new Map<number, number>();
  for (const { exitAge, failed } of watched) if (failed) failures.set(exitAge, (failures.get(exitAge) ?? 0) + 1);
  return { failures, atRisk: (age: number) => countBelow(entries, age) - countBelow(exits, age) };
}

/** Every age at which some failed, in order. @throws RangeError for illegal spells */
export function jointRows({ treated, others }: TwoGroups): JointRow[] {
  const [one, two] = [counter(treated), counter(others)];
  const ages = [...new Set([...one.failures.keys(), ...two.failures.keys()])].sort((a, b) => a - b);
  return ages.map((age) => {
    const [treatedAtRisk, treatedFailed] = [one.atRisk(age), one.failures.get(age) ?? 0];
    return { age, treatedAtRisk, treatedFailed, atRisk: treatedAtRisk + two.atRisk(age), failed: treatedFailed + (two.failures.get(age) ?? 0) };
  });
}
