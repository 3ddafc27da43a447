import { describe, expect, it } from 'vitest';
import { cox } from '@/lib/reliability/practices/cox';
import { logRank } from '@/lib/reliability/practices/log-rank';
import { falseDiscoveryRates } from '@/lib/reliability/repeats/false-discovery';
import type { History } from '@/lib/reliability/recurrence/history';
import { meanCumulative } from '@/lib/reliability/recurrence/mean-cumulative';
import { reverseArrangements } from '@/lib/reliability/recurrence/trend';
import { riskTable } from '@/lib/reliability/spells/risk-table';
import type { Spell } from '@/lib/reliability/spells/spell';
import { seededRandom } from '@/tests/support/random';
import { historyDraws, spellDraws } from '@/tests/support/reliability-draws';

const SIZES = [1, 2, 5, 50, 500, 5000];
const close = (got: number, expected: number) => expect(Math.abs(got - expected)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(expected)));

const atRisk = (spells: readonly Spell[], age: number) => spells.filter(({ entryAge = 0, exitAge }) => (entryAge === 0 || entryAge < age) && age <= exitAge);

/** The definition, summed over every unit at every age. */
function directMean(histories: readonly History[]) {
  const ages = [...new Set(histories.flatMap(({ events }) => events))].sort((a, b) => a - b);
  const own = histories.map(() => 0);
  let mean = 0;
  return ages.map((age) => {
    const watched = histories.map(({ from = 0, until }) => (from === 0 || from < age) && age <= until);
    const counts = histories.map(({ events }, i) => (watched[i] ? events.filter((event) => event === age).length : 0));
    const [n, d] = [watched.filter(Boolean).length, counts.reduce((sum, count) => sum + count, 0)];
    mean += d / n;
    for (const [i, count] of counts.entries()) if (watched[i]) own[i] = (own[i] ?? 0) + (count - d / n) / n;
    return { age, atRisk: n, events: d, mean, variance: own.reduce((sum, value) => sum + value * value, 0) };
  });
}

describe('streams against the obvious form', () => {
  it.each(SIZES)('counts who is at risk over %i spells', (size) => {
    const spells = spellDraws(seededRandom(size), size);
    for (const row of riskTable(spells)) {
      const ending = spells.filter(({ exitAge }) => exitAge === row.age);
      expect(row).toEqual({
        age: row.age,
        atRisk: atRisk(spells, row.age).length,
        failed: ending.filter(({ failed }) => failed).length,
        censored: ending.filter(({ failed }) => !failed).length,
      });
    }
  });

  it.each([[1, 5], [2, 1], [20, 50], [300, 500], [500, 5000]])('sums %i units with about %i events into a mean and its robust variance', (units, events) => {
    const histories = historyDraws(seededRandom(units + events), units, events);
    const direct = directMean(histories);
    const steps = meanCumulative(histories);
    expect(steps).toHaveLength(direct.length);
    for (const [i, expected] of direct.entries()) {
      const step = steps[i];
      expect(step).toMatchObject({ age: expected.age, atRisk: expected.atRisk, events: expected.events });
      close(step?.mean ?? NaN, expected.mean);
      if (units > 1) expect(Math.abs((step?.standardError ?? NaN) ** 2 - expected.variance)).toBeLessThan(1e-9 * Math.max(1e-3, expected.variance));
    }
  });

  it.each([5, 50, 500, 2500])('compares two groups of %i', (size) => {
    const random = seededRandom(size);
    const [treated, others] = [spellDraws(random, size), spellDraws(random, size)];
    const all = [...treated, ...others];
    let [excess, variance] = [0, 0];
    for (const age of new Set(all.flatMap(({ exitAge, failed }) => (failed ? [exitAge] : [])))) {
      const [n, n1] = [atRisk(all, age).length, atRisk(treated, age).length];
      const d = all.filter(({ exitAge, failed }) => failed && exitAge === age).length;
      excess += treated.filter(({ exitAge, failed }) => failed && exitAge === age).length - (d * n1) / n;
      if (n > 1) variance += (d * (n1 / n) * (1 - n1 / n) * (n - d)) / (n - 1);
    }
    const result = logRank([{ treated, others }]);
    if (result.kind !== 'estimated') throw new Error(result.why);
    close(result.chiSquared, excess ** 2 / variance);
  });

  it.each([10, 100, 800])('finds the robust error of Cox over %i spells as the sum over units of their scores', (size) => {
    const random = seededRandom(size);
    const named = (group: string) => spellDraws(random, size).map((spell, i) => ({ ...spell, cluster: `${group} ${i % Math.ceil(size / 3)}` }));
    const [treated, others] = [named('a'), named('b')];
    const result = cox([{ treated, others }], { ties: 'breslow' });
    if (result.kind !== 'estimated') throw new Error(result.why);
    const ratio = result.hazardRatio;
    const all = [...treated.map((spell) => ({ ...spell, x: 1 })), ...others.map((spell) => ({ ...spell, x: 0 }))];
    const scores = new Map<string, number>();
    let information = 0;
    for (const failing of all.filter(({ failed }) => failed)) {
      const risk = all.filter((spell) => atRisk([spell], failing.exitAge).length > 0);
      const weight = risk.reduce((sum, { x }) => sum + ratio ** x, 0);
      const share = risk.reduce((sum, { x }) => sum + x * ratio ** x, 0) / weight;
      information += share * (1 - share);
      const add = (cluster: string, score: number) => scores.set(cluster, (scores.get(cluster) ?? 0) + score);
      add(failing.cluster, failing.x - share);
      for (const { x, cluster } of risk) add(cluster, (-(ratio ** x) * (x - share)) / weight);
    }
    close(result.standardError, Math.sqrt([...scores.values()].reduce((sum, score) => sum + score * score, 0)) / information);
  });

  it.each(SIZES)('adjusts %i p-values', (size) => {
    const random = seededRandom(size);
    const ps = Array.from({ length: size }, () => Math.round(random.unit() * 1000) / 1000);
    const ordered = ps.toSorted((a, b) => a - b);
    const last = (p: number) => ordered.findLastIndex((other) => other <= p);
    const adjusted = falseDiscoveryRates(ps);
    const ladder = ordered.map((p, i) => (p * size) / (i + 1));
    for (const [i, p] of ps.slice(0, 500).entries()) close(adjusted[i] ?? NaN, Math.min(1, ...ladder.slice(last(p))));
  });

  it.each([2, 50, 3000])('counts the pairs among %i gaps of which the later is longer', (size) => {
    const random = seededRandom(size);
    const gaps = Array.from({ length: size }, () => random.below(200));
    let pairs = 0;
    for (let i = 0; i < size; i += 1) for (let j = i + 1; j < size; j += 1) if ((gaps[j] ?? 0) > (gaps[i] ?? 0)) pairs += 1;
    expect(reverseArrangements(gaps)).toMatchObject({ arrangements: pairs });
  });
});
