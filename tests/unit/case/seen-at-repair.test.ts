import { describe, expect, it } from 'vitest';
import { findingsForRanking, stagesOf } from '@/lib/case/findings-for-ranking';
import { checksAtRepair } from '@/lib/case/view/checks-at-repair';
import { compileRulebook } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import type { Stage } from '@/lib/diagnose/types';

const DIAGNOSIS: Stage = { kind: 'diagnosis' };
const after = (remedy: number): Stage => ({ kind: 'after-remedy', remedy });

let count = 0;
function row(checkId: string, stage: Stage, state: string | null, source = stage.kind === 'after-remedy' ? 'remedy' : 'asked') {
  const at = new Date(Date.UTC(2026, 2, 2) + ++count * 1000);
  return { id: `id-${count}`, checkId, stage, source, kind: state ? 'state' : 'cannot-tell', shares: state ? [{ state, share: 1 }] : [], reliability: 1, correctedAt: at, receivedAt: at };
}

const ranked = (...rows: ReturnType<typeof row>[]) => findingsForRanking(rows).map(({ checkId, stage, shares }) => [checkId, stage.kind, shares[0]?.state ?? null]);

describe('what a ranking takes', () => {
  it('is the diagnosis, and what was seen at a repair of a check that it left open', () => {
    expect(ranked(row('oil', DIAGNOSIS, 'yes'), row('bore', after(1), 'worn'))).toEqual([['oil', 'diagnosis', 'yes'], ['bore', 'after-remedy', 'worn']]);
    expect(ranked(row('bore', DIAGNOSIS, null), row('bore', after(1), 'worn'))).toEqual([['bore', 'after-remedy', 'worn']]);
  });

  it('is never what contradicts the reading that led to the repair', () => {
    expect(ranked(row('oil', DIAGNOSIS, 'yes'), row('oil', after(1), 'no'))).toEqual([['oil', 'diagnosis', 'yes']]);
    expect(ranked(row('bore', after(2), 'sound'), row('bore', after(1), 'worn'))).toEqual([['bore', 'after-remedy', 'worn']]);
  });

  it('is nothing that was measured for a release or in a watch', () => {
    expect(ranked(row('oil', { kind: 'release' }, 'no'), row('oil', { kind: 'watch' }, 'no'))).toEqual([]);
  });

  it('says which stages it uses', () => {
    expect(stagesOf([])).toEqual([DIAGNOSIS]);
    expect(stagesOf(findingsForRanking([row('bore', after(2), 'worn'), row('oil', DIAGNOSIS, 'yes')]))).toEqual([DIAGNOSIS, after(2)]);
  });
});

it('offers at a repair what tells most of its causes, what is open first', () => {
  const compiled = compileRulebook(defaultRulebook);
  for (const remedy of defaultRulebook.remedies) expect(checksAtRepair(compiled, remedy).length).toBeLessThanOrEqual(8);
  const drain = defaultRulebook.remedies.find(({ causes }) => causes.includes('drain-choked-by-sealant'));
  if (!drain) throw new Error('no such remedy');
  const opened = (id: string | undefined) => defaultRulebook.checks.find((check) => check.id === id)?.setUp.access?.includes('compressor-off') ?? false;
  const looks = checksAtRepair(compiled, drain);
  expect(looks).toContain('sealant-in-drain');
  expect(opened(looks[0])).toBe(true);
  expect(looks.findLastIndex(opened)).toBe(looks.filter(opened).length - 1);
});
