import { sumOfUniforms } from './sum-of-uniforms';

/** One input of a sum: what was read, and how far it can be off. */
export interface Reading {
  readonly value: number;
  /** The true value lies anywhere within so much of it, each place as likely. In the unit of the value. */
  readonly halfWidth: number;
  /** The value is a total of so many readings, each off by up to the half-width, independently. */
  readonly times?: number;
}

export interface Band<Name extends string = string> {
  readonly value: number;
  /** Where the value lies with 95 % probability. Undefined where there is no value so far out: "never" is within reach. */
  readonly low: number | undefined;
  readonly high: number | undefined;
  /** The share of each input in the variance, largest first; they sum to 1, or are all 0 where no input can be off. */
  readonly shares: readonly { readonly input: Name; readonly share: number }[];
}

/** The probability that the true value lies within the band. */
export const COVERAGE = 0.95;

/**
 * How far a result can be off, from how far each of its inputs can.
 *
 * First order: each input moves the result in proportion, by half the difference between the results at plus and minus
 * one standard uncertainty, u = half-width / sqrt(3). The distribution of the sum of those moves is worked out, not taken
 * for normal (`sumOfUniforms`); its quantile says how far to go. There the function itself is asked, with each input
 * moved by its likeliest part of the way, so that a curved function has a band that is wider on its steeper side.
 *
 * @param evaluate the result for inputs; undefined where there is none (the tank never fills). It may throw a RangeError
 *   for inputs out of its range: no true value is there, and the band ends before
 * @param readings by name
 * @returns undefined where there is no result for the inputs as read
 * @throws whatever `evaluate` throws for the inputs as read
 * @see JCGM 100:2008 (GUM) 5.1.2 and 5.1.3 note 2; JCGM 101:2008 for the distribution of a sum
 * @example
 * band(({ v, t }) => v / t, { v: { value: 30, halfWidth: 1 }, t: { value: 20, halfWidth: 0 } })
 * // { value: 1.5, low: 1.4525, high: 1.5475, shares: [{ input: 'v', share: 1 }, { input: 't', share: 0 }] }
 */
export function band<Name extends string>(evaluate: (inputs: Readonly<Record<Name, number>>) => number | undefined, readings: Readonly<Record<Name, Reading>>): Band<Name> | undefined {
  const names = Object.keys(readings) as Name[];
  const asRead = Object.fromEntries(names.map((name) => [name, readings[name].value])) as Record<Name, number>;
  const value = evaluate(asRead);
  if (value === undefined) return undefined;

  /** The result with inputs moved; undefined where there is none, 'out' where an input would leave its range. */
  const moved = (by: Partial<Record<Name, number>>, share = 1): number | undefined | 'out' => {
    const inputs = Object.fromEntries(names.map((name) => [name, readings[name].value + share * (by[name] ?? 0)])) as Record<Name, number>;
    try {
      return evaluate(inputs);
    } catch (error) {
      if (error instanceof RangeError) return 'out';
      throw error;
    }
  };

  const parts = names.map((name) => {
    const { halfWidth, times = 1 } = readings[name];
    const uncertainty = halfWidth / Math.sqrt(3);
    const alone = (by: number) => moved({ [name]: by } as Partial<Record<Name, number>>);
    const slope = halfWidth > 0 ? difference(alone(-uncertainty), value, alone(uncertainty)) / uncertainty : 0;
    return { name, slope, halfWidth, times, variance: times * (slope * halfWidth) ** 2 };
  });

  const variance = parts.reduce((sum, part) => sum + part.variance, 0);
  const shares = parts.map(({ name, variance: own }) => ({ input: name, share: variance > 0 ? own / variance : 0 })).sort((a, b) => b.share - a.share);
  if (variance === 0) return { value, low: value, high: value, shares };

  const distance = sumOfUniforms(parts.flatMap(({ slope, halfWidth, times }) => Array<number>(times).fill(slope * halfWidth)), COVERAGE);
  const way = likeliestWay(parts.map(({ slope, halfWidth, times }) => ({ reach: Math.abs(slope) * halfWidth * times, variance: times * (slope * halfWidth) ** 2 })), distance);
  const end = (direction: 1 | -1) => {
    const by = Object.fromEntries(parts.map(({ name, slope }, i) => [name, slope === 0 ? 0 : (direction * (way[i] ?? 0)) / slope])) as Partial<Record<Name, number>>;
    return furthest((share) => moved(by, share));
  };
  return { value, low: end(-1), high: end(1), shares };
}

/** Half of what lies between the results on both sides; where one side has none, the other alone tells how steep it is. */
function difference(down: number | undefined | 'out', value: number, up: number | undefined | 'out'): number {
  if (typeof up === 'number') return typeof down === 'number' ? (up - down) / 2 : up - value;
  return typeof down === 'number' ? value - down : 0;
}

/** The result at the end of a way, or where it leaves the range of the inputs: what cannot be is not as likely. */
function furthest(at: (share: number) => number | undefined | 'out'): number | undefined {
  const whole = at(1);
  if (whole !== 'out') return whole;
  let [inside, outside] = [0, 1];
  for (let halvings = 0; halvings < 40; halvings += 1) {
    const middle = (inside + outside) / 2;
    if (at(middle) === 'out') outside = middle;
    else inside = middle;
  }
  const last = at(inside);
  return last === 'out' ? undefined : last;
}

/**
 * How much of a distance each part goes: in proportion to its variance, as is likeliest for errors that add up to it, and
 * none further than it reaches. What one cannot go is left to the others.
 */
function likeliestWay(parts: readonly { reach: number; variance: number }[], distance: number): number[] {
  const way = parts.map(() => 0);
  const free = new Set(parts.keys());
  let left = distance;
  while (free.size > 0 && left > 0) {
    const total = [...free].reduce((sum, i) => sum + (parts[i]?.variance ?? 0), 0);
    if (total === 0) break;
    const full = [...free].filter((i) => left * ((parts[i]?.variance ?? 0) / total) >= (parts[i]?.reach ?? 0));
    if (full.length === 0) {
      for (const i of free) way[i] = left * ((parts[i]?.variance ?? 0) / total);
      break;
    }
    for (const i of full) {
      way[i] = parts[i]?.reach ?? 0;
      left -= way[i] ?? 0;
      free.delete(i);
    }
  }
  return way;
}
