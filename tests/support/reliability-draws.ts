import { gammaQuantile } from '@/lib/reliability/special/gamma-quantile';
import type { Spell } from '@/lib/reliability/spells/spell';
import type { History } from '@/lib/reliability/recurrence/history';
import type { Random } from '@/tests/support/random';

/** Poisson, by the product of uniform numbers: for means of a few. */
export function poissonDraw(random: Random, mean: number): number {
  const limit = Math.exp(-mean);
  let count = 0;
  for (let product = random.unit(); product > limit; product *= random.unit()) count += 1;
  return count;
}

export const exponentialDraw = (random: Random, rate: number): number => -Math.log(1 - random.unit()) / rate;

export const weibullDraw = (random: Random, { shape, scale }: { shape: number; scale: number }): number =>
  scale * (-Math.log(1 - random.unit())) ** (1 / shape);

export const gammaDraw = (random: Random, { shape, mean }: { shape: number; mean: number }): number =>
  (gammaQuantile(shape, { below: Math.min(Math.max(random.unit(), 1e-12), 1 - 1e-12) }) * mean) / shape;

/** Spells with ties, some begun late, some still running. */
export function spellDraws(random: Random, count: number, { late = 0.3, days = 1000 } = {}): Spell[] {
  return Array.from({ length: count }, () => {
    const entryAge = random.chance(late) ? random.below(days / 2) : 0;
    return { entryAge, exitAge: entryAge + 1 + random.below(days), failed: random.chance(0.5) };
  });
}

/** Units with about `events` repairs in all, on whole days, so that they tie. */
export function historyDraws(random: Random, units: number, events: number, { late = 0.3 } = {}): History[] {
  return Array.from({ length: units }, () => {
    const from = random.chance(late) ? random.below(400) : 0;
    const until = from + 50 + random.below(1500);
    const count = poissonDraw(random, events / units);
    return { from, until, events: Array.from({ length: count }, () => from + 1 + random.below(until - from)) };
  });
}
