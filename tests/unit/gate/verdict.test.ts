import { describe, expect, it } from 'vitest';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { natsOf, type EvidenceTerm, type RankedCause } from '@/lib/diagnose';
import { causesOfTheCompressor, verdictOf } from '@/lib/gate/verdict';

const term = (findingIds: string[], decibans: number): EvidenceTerm => ({ kind: 'table', findingIds, checkIds: findingIds, rules: [], group: 'g', weightNats: natsOf(decibans), countedNats: natsOf(decibans) });
const ranked = (causeId: string, p: number, terms: EvidenceTerm[] = []): RankedCause => ({ causeId, p, scoreNats: 0, prior: p, terms });
const OURS = new Set(['worn', 'cracked']);
const verdict = (causes: RankedCause[], answered: string[] = []) => verdictOf(causes, OURS, new Set(answered));

describe('the verdict of the gate', () => {
  it('is “fit” from one half on, unless one other cause has a quarter', () => {
    expect(verdict([ranked('worn', 0.3), ranked('cracked', 0.2), ranked('drain', 0.2), ranked('line', 0.2), ranked('leak', 0.1)])).toMatchObject({ verdict: 'fit', ofTheCompressor: 0.5 });
    expect(verdict([ranked('worn', 0.49), ranked('drain', 0.2), ranked('line', 0.2), ranked('leak', 0.11)]).verdict).toBe('not-yet');
    expect(verdict([ranked('worn', 0.7), ranked('line', 0.25), ranked('leak', 0.05)]).verdict).toBe('not-yet');
    expect(verdict([ranked('worn', 0.7), ranked('line', 0.24), ranked('leak', 0.06)]).verdict).toBe('fit');
  });

  it('rests “not yet” on what lies outside the compressor, and “fit” on what lies in it, three at most and none below a tenth', () => {
    const not = verdict([ranked('worn', 0.3), ranked('a', 0.2), ranked('b', 0.15), ranked('c', 0.12), ranked('d', 0.11), ranked('e', 0.09)]);
    expect(not.reasons.map(({ causeId }) => causeId)).toEqual(['a', 'b', 'c']);
    expect(verdict([ranked('worn', 0.85), ranked('cracked', 0.09), ranked('a', 0.06)]).reasons.map(({ causeId }) => causeId)).toEqual(['worn']);
  });

  it('gives as a reason no answer but its own, and none that speaks against', () => {
    const causes = [ranked('drain', 0.6, [term(['mine'], 6), term(['theirs'], 12), term(['mine', 'theirs'], 3), term(['weak'], 2), term(['against'], -6)]), ranked('worn', 0.4)];
    expect(verdict(causes, ['mine', 'weak', 'against']).reasons[0]?.because).toEqual([{ checkId: 'mine', word: 'clearly' }, { checkId: 'weak', word: 'a little' }]);
    expect(verdict(causes).reasons[0]?.because).toEqual([]);
  });

  it('takes from the rulebook what another compressor removes', () => {
    expect([...causesOfTheCompressor(defaultRulebook)].sort()).toEqual(['crank-or-bearing-failed', 'head-gasket-failed', 'intake-dirt-ingested', 'rings-worn', 'unloader-stuck', 'valve-leaking']);
    expect(causesOfTheCompressor({ remedies: [{ causes: ['worn'] }] }).size).toBe(0);
  });
});
