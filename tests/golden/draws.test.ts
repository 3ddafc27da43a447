import { describe, expect, it } from 'vitest';
import { compiled } from './findings';
import { drawAndRank, type DrawResult } from './draws';

/** Fourteen thousand rankings of a full case take half a minute on a quiet machine. */
const LONG = 600_000;

const percent = (share: number) => `${Math.round(100 * share)} %`;
const table = (title: string, results: readonly DrawResult[]) =>
  [title, ...results.map(({ cause, first, firstThree }) => `  ${cause.padEnd(34)} first ${percent(first)}, first three ${percent(firstThree)}`)].join('\n');

describe('cases drawn from a cause’s own tables', () => {
  it('have that cause among the first three in at least 60 % of 500, every check answered', () => {
    const results = drawAndRank(500);
    console.info(table('Every check answered:', results));
    expect(results.map(({ cause }) => cause)).toEqual(compiled.causeIds);
    expect(results.filter(({ firstThree }) => firstThree < 0.6)).toEqual([]);
  }, LONG);

  it('have it there in at least 60 % with a random half of the checks answered', () => {
    const results = drawAndRank(200, Math.ceil(compiled.checks.size / 2));
    console.info(table('A random half answered:', results));
    expect(results.filter(({ firstThree }) => firstThree < 0.6)).toEqual([]);
  }, LONG);

  it('have it there more often than chance with 20 random checks answered', () => {
    const results = drawAndRank(200, 20);
    console.info(table('20 random checks answered:', results));
    const chance = 3 / compiled.causeIds.length;
    expect(results.filter(({ firstThree }) => firstThree < 2 * chance)).toEqual([]);
  }, LONG);
});
