/** A small seeded generator (mulberry32), so that a failing case can be made again from its number. */
export interface Random {
  /** In [0, 1). */
  unit(): number;
  /** Whole number in [0, below). */
  below(below: number): number;
  between(low: number, high: number): number;
  chance(p: number): boolean;
  pick<T>(items: readonly T[]): T;
  shuffle<T>(items: readonly T[]): T[];
}

export function seededRandom(seed: number): Random {
  let state = seed >>> 0;
  const unit = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const below = (limit: number) => Math.floor(unit() * limit);
  return {
    unit,
    below,
    between: (low, high) => low + unit() * (high - low),
    chance: (p) => unit() < p,
    pick: <T>(items: readonly T[]): T => {
      if (items.length === 0) throw new RangeError('nothing to pick from');
      return items[below(items.length)] as T;
    },
    shuffle: <T>(items: readonly T[]): T[] => {
      const keyed = items.map((item) => ({ item, key: unit() }));
      return keyed.sort((a, b) => a.key - b.key).map(({ item }) => item);
    },
  };
}
