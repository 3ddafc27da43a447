/**
 * How the streams of fleet statistics grow: a million events beside ten thousand. In proportion that is 100; the order of a
 * list adds a little, the obvious form would take 10,000.
 */
import { logRank } from '@/lib/reliability/practices/log-rank';
import { meanCumulative } from '@/lib/reliability/recurrence/mean-cumulative';
import { kaplanMeier } from '@/lib/reliability/spells/kaplan-meier';
import { seededRandom, type Random } from '@/tests/support/random';

const MANY = 1_000_000;
const FEW = 10_000;

const spells = (random: Random, count: number) =>
  Array.from({ length: count }, () => ({ exitAge: random.below(4000), failed: random.chance(0.5) }));

/** Ten events a unit, as in the fleet that the design measured. */
const histories = (random: Random, events: number) =>
  Array.from({ length: events / 10 }, () => {
    const until = 500 + random.below(3500);
    return { until, events: Array.from({ length: 10 }, () => random.below(until)) };
  });

export function growth() {
  const random = seededRandom(7);
  const data = [MANY, FEW].map((count) => ({ spells: spells(random, count), histories: histories(random, count) }));
  const [many, few] = data;
  if (!many || !few) throw new Error('no data');
  const half = ({ spells: all }: typeof many) => [{ treated: all.slice(0, all.length / 2), others: all.slice(all.length / 2) }];
  const [manyGroups, fewGroups] = [half(many), half(few)];
  return [
    { name: 'Kaplan-Meier', a: () => kaplanMeier(many.spells), b: () => kaplanMeier(few.spells) },
    { name: 'mean cumulative function', a: () => meanCumulative(many.histories), b: () => meanCumulative(few.histories) },
    { name: 'log-rank', a: () => logRank(manyGroups), b: () => logRank(fewGroups) },
  ];
}
