/** Chance with a seed. Streams are forked by name, so that drawing once more in one place changes nothing in another. */
export interface Random {
  /** [0, 1) */
  unit(): number;
  chance(p: number): boolean;
  /** [low, high) */
  between(low: number, high: number): number;
  /** A whole number, low and high included. */
  whole(low: number, high: number): number;
  /** Standard normal. */
  normal(): number;
  /** Exponential with this mean. */
  waiting(mean: number): number;
  pick<T>(items: readonly T[]): T;
  /** A key of the table, as often as its weight says. */
  weighted<K extends string>(weights: Readonly<Record<K, number>>): K;
  /** An index, as often as its weight says. */
  index(weights: ArrayLike<number>): number;
  shuffled<T>(items: readonly T[]): T[];
  bytes(count: number): Uint8Array;
  fork(name: string): Random;
}

/**
 * @param name the same name gives the same numbers on every machine
 * @example randomFrom('demo').fork('units').unit()
 */
export function randomFrom(name: string): Random {
  const unit = generator(name);
  const between = (low: number, high: number) => low + unit() * (high - low);
  const whole = (low: number, high: number) => low + Math.floor(unit() * (high - low + 1));
  const index = (weights: ArrayLike<number>): number => {
    let total = 0;
    for (let i = 0; i < weights.length; i += 1) total += weights[i] ?? 0;
    let left = unit() * total;
    for (let i = 0; i < weights.length; i += 1) {
      left -= weights[i] ?? 0;
      if (left < 0) return i;
    }
    return weights.length - 1;
  };
  return {
    unit,
    chance: (p) => unit() < p,
    between,
    whole,
    normal: () => Math.sqrt(-2 * Math.log(1 - unit())) * Math.cos(2 * Math.PI * unit()),
    waiting: (mean) => -mean * Math.log(1 - unit()),
    pick: (items) => {
      const item = items[whole(0, items.length - 1)];
      if (item === undefined) throw new RangeError('nothing to pick from');
      return item;
    },
    weighted: <K extends string>(weights: Readonly<Record<K, number>>) => {
      const keys = Object.keys(weights) as K[];
      return keys[index(keys.map((key) => weights[key]))] as K;
    },
    index,
    shuffled: (items) =>
      items
        .map((item) => ({ item, key: unit() }))
        .sort((a, b) => a.key - b.key)
        .map(({ item }) => item),
    bytes: (count) => Uint8Array.from({ length: count }, () => Math.floor(unit() * 256)),
    fork: (child) => randomFrom(`${name}/${child}`),
  };
}

/** sfc32 of the PractRand suite, public domain; its four words of state are hashed from the name. */
function generator(name: string): () => number {
  let [a, b, c, d] = [1, 2, 3, 4].map((salt) => hashed(`${salt} ${name}`)) as [number, number, number, number];
  const next = () => {
    const sum = (((a + b) | 0) + d) | 0;
    d = (d + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = (((c << 21) | (c >>> 11)) + sum) | 0;
    return (sum >>> 0) / 2 ** 32;
  };
  // The first numbers still show the words they started from.
  for (let i = 0; i < 15; i += 1) next();
  return next;
}

/** FNV-1a, 32 bits, stirred once more so that names that differ in their last letter part company. */
function hashed(text: string): number {
  let hash = 0x811c9dc5;
  for (const letter of text) hash = Math.imul(hash ^ (letter.codePointAt(0) ?? 0), 0x01000193);
  hash = Math.imul(hash ^ (hash >>> 16), 0x85ebca6b);
  return (hash ^ (hash >>> 13)) | 0;
}
