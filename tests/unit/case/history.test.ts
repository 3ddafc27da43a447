import { describe, expect, it } from 'vitest';
import { compareStates } from '@/lib/case/compare-states';
import { stepAt, stepsOf } from '@/lib/case/steps';
import type { CaseState, FindingView } from '@/lib/schemas/case-view';

const at = (minute: number) => new Date(Date.UTC(2026, 0, 1, 8, minute)).toISOString();

describe('steps of a case', () => {
  const steps = stepsOf([
    { at: at(0), what: 'Case opened' },
    { at: at(0), what: 'Oil in the air system: Yes' },
    { at: at(5), what: 'Cause called' },
  ]);

  it('are one for what came at one instant', () => {
    expect(steps).toEqual([{ at: at(0), what: 'Case opened; Oil in the air system: Yes' }, { at: at(5), what: 'Cause called' }]);
  });

  it('are found by any instant, however it is written', () => {
    expect([null, at(0), at(4), at(5), at(9), '2000-01-01', '2026-01-01T09:05:00+01:00'].map((when) => stepAt(steps, when))).toEqual([1, 0, 0, 1, 1, 0, 1]);
  });
});

describe('two moments', () => {
  const finding = (id: string, minute: number, source = 'asked') => ({ id, receivedAt: at(minute), source }) as FindingView;
  const state = (shares: Record<string, number>, findings: FindingView[]) =>
    ({ causes: Object.entries(shares).map(([causeId, p]) => ({ causeId, p })), findings }) as CaseState;
  const before = state({ worn: 0.6, sealant: 0.35, dust: 0.03, heat: 0.02 }, [finding('a', 0)]);
  const after = state({ sealant: 0.9, worn: 0.08, heat: 0.01, dust: 0.01 }, [finding('c', 9), finding('b', 3), finding('r', 3, 'record'), finding('a', 0)]);
  const compared = compareStates(before, after);

  it('show each cause at both, in the later order, with the places it moved', () => {
    expect(compared.causes).toEqual([
      { causeId: 'sealant', before: 0.35, after: 0.9, places: 1 },
      { causeId: 'worn', before: 0.6, after: 0.08, places: -1 },
      { causeId: 'dust', before: 0.03, after: 0.01, places: -1 },
    ]);
    expect(compared.rest).toEqual({ before: 0.02, after: 0.01 });
  });

  it('tell what was answered between them, in the order it came', () => {
    expect(compared.answered.map(({ id }) => id)).toEqual(['b', 'c']);
    expect(compareStates(after, after).answered).toEqual([]);
  });
});
