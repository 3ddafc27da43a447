import { describe, expect, it } from 'vitest';
import { rank, type Finding } from '@/lib/diagnose';
import { explain } from '@/lib/diagnose/explain';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { compiled, findingsOf, thoughtSo } from './findings';
import { teachingCases } from './teaching-cases';

/** The case with one finding taken away, and with one answered "think so", for each finding. */
function weakened(findings: readonly Finding[]): { how: string; findings: Finding[] }[] {
  return findings.flatMap((one) => [
    { how: `without ${one.checkId}`, findings: findings.filter((finding) => finding !== one) },
    { how: `${one.checkId} answered think so`, findings: findings.map((finding) => (finding === one ? thoughtSo(one) : finding)) },
  ]);
}

const leaders = (causes: readonly { causeId: string }[], count: number) => causes.slice(0, count).map(({ causeId }) => causeId);

describe('the teaching cases', () => {
  it('are the twelve of the trade', () => {
    expect(teachingCases.map(({ id }) => id)).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]);
  });
});

describe.each(teachingCases)('teaching case $id: $title', ({ expected, because, told }) => {
  describe.each(told)('$how', ({ findings: given, facts }) => {
    const findings = findingsOf(given, facts);
    const options = { facts };

    it(`puts ${expected.join(' and ')} first, because ${because}`, async () => {
      expect(leaders(rank(compiled, findings, options).causes, expected.length).sort()).toEqual([...expected].sort());
      const run = await runOfRecord(compiled, findings, options);
      expect(run.agreed).toBe(true);
      expect(leaders(run.ranking.causes, expected.length).sort()).toEqual([...expected].sort());
      expect(run.ranking.fit).toEqual({ fits: true });
    });

    it('keeps it among the first three with any one finding removed or answered think so', async () => {
      for (const { how, findings: fewer } of weakened(findings)) {
        const compiledFirst = leaders(rank(compiled, fewer, options).causes, 3);
        const ofRecord = leaders((await runOfRecord(compiled, fewer, options)).ranking.causes, 3);
        for (const cause of expected) {
          expect(compiledFirst, how).toContain(cause);
          expect(ofRecord, `${how}, of record`).toContain(cause);
        }
      }
    });

    it('gives each leading cause a reason for it that can be read', () => {
      const explained = explain(compiled, findings, options);
      for (const causeId of expected) {
        const cause = explained.causes.find((each) => each.causeId === causeId);
        const readable = cause?.reasons.filter(({ strength, rules }) => strength?.direction === 'for' && rules.some(({ note }) => note.length > 10));
        expect(readable?.length, causeId).toBeGreaterThan(0);
      }
    });
  });
});
