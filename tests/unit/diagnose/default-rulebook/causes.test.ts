import { describe, expect, it } from 'vitest';
import { causes } from '@/lib/diagnose/default-rulebook/causes';
import { settings } from '@/lib/diagnose/default-rulebook/settings';
import { NORMAL_CARRYOVER, SOMETHING_ELSE } from '@/lib/diagnose/types';

/** Station, id and prior in per cent as the brief of the trade gives them; the priors are judgement. */
const BRIEF: [string | null, string, number][] = [
  ['crankcase-and-drain', 'drain-choked-by-sealant', 5],
  ['crankcase-and-drain', 'drain-restricted', 3],
  ['crankcase-and-drain', 'crankcase-pressure-high', 4],
  ['crankcase-and-drain', 'engine-oil-overfull', 2],
  ['oil-feed', 'oil-feed-restricted', 2],
  ['oil-feed', 'oil-degraded', 2],
  ['intake', 'intake-filter-clogged', 4],
  ['intake', 'intake-hose-collapsed', 3],
  ['intake', 'intake-dirt-ingested', 2],
  ['intake', 'oil-in-intake-air', 2],
  ['cylinder-and-head', 'rings-worn', 9],
  ['cylinder-and-head', 'rings-not-seated', 3],
  ['cylinder-and-head', 'valve-leaking', 3],
  ['cylinder-and-head', 'head-gasket-failed', 3],
  ['cylinder-and-head', 'coolant-starved', 2],
  ['unloader-and-governor', 'governor-faulty', 3],
  ['unloader-and-governor', 'unloader-stuck', 3],
  ['discharge-line', 'discharge-line-carboned', 8],
  ['discharge-line', 'discharge-line-kinked-or-frozen', 2],
  ['dryer', 'dryer-restricted', 2],
  ['dryer', 'dryer-overdue', 5],
  ['dryer', 'purge-or-check-valve-leaking', 3],
  ['tanks-and-system', 'system-leaks', 5],
  ['tanks-and-system', 'demand-too-high', 2],
  ['drive', 'drive-gear-failed', 1],
  ['drive', 'crank-or-bearing-failed', 1],
  [null, 'normal-carryover', 9],
  [null, 'something-else', 7],
];

describe('causes of the default rulebook', () => {
  it('are those of the brief, at their stations, with their priors', () => {
    const got = causes.map(({ station, id, prior }) => [station, id, Math.round(prior * 1e6) / 1e4]);
    expect(got).toEqual(BRIEF);
  });

  it('have priors that sum to 1', () => {
    expect(causes.reduce((sum, { prior }) => sum + prior, 0)).toBeCloseTo(1, 12);
  });

  it('call every prior a judgement', () => {
    expect(new Set(causes.map(({ basis }) => basis))).toEqual(new Set(['judgement']));
  });

  it('say each in one sentence and under a short name', () => {
    for (const { id, name, sentence } of causes) {
      expect(sentence, id).toMatch(/^[A-Z][^.]+\.$/);
      expect(name.length, id).toBeLessThanOrEqual(42);
    }
  });

  it('leave only normal carryover cheaper than the service cost', () => {
    const cheaper = causes.filter(({ costIfLeft }) => costIfLeft !== undefined && costIfLeft < settings.serviceCost);
    expect(cheaper.map(({ id }) => id)).toEqual([NORMAL_CARRYOVER]);
    expect(causes.find(({ id }) => id === SOMETHING_ELSE)?.costIfLeft).toBeUndefined();
  });
});
