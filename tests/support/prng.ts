/**
 * A small seeded generator (mulberry32): good enough to draw cases, and the same on every machine.
 *
 * @param seed any integer
 * @returns numbers in [0, 1)
 * @example const random = seededRandom(7); random()
 */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Picks an index with the chances given, which sum to 1. */
export function pickIndex(random: () => number, chances: readonly number[]): number {
  let left = random();
  for (const [index, chance] of chances.entries()) {
    left -= chance;
    if (left < 0) return index;
  }
  return chances.length - 1;
}

/** `count` different items of a list, in random order. */
export function sample<T>(random: () => number, items: readonly T[], count: number): T[] {
  const pool = [...items];
  for (let i = 0; i < Math.min(count, pool.length); i += 1) {
    const j = i + Math.floor(random() * (pool.length - i));
    const [a, b] = [pool[i], pool[j]];
    if (a !== undefined && b !== undefined) [pool[i], pool[j]] = [b, a];
  }
  return pool.slice(0, count);
}
