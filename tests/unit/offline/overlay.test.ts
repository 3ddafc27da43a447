import { describe, expect, test } from 'vitest';
import { differenceOf } from '@/components/case/data/difference';
import { withWaiting } from '@/components/case/data/overlay';
import type { Kept } from '@/lib/offline/waiting';
import type { CaseState, FindingView, RulebookView } from '@/lib/schemas/case-view';

const finding = (id: string, checkId: string, more: Partial<FindingView> = {}): FindingView => ({
  id, checkId, stage: { kind: 'diagnosis' }, source: 'asked', kind: 'state', answer: 'No', shares: [{ state: 'no', share: 1 }], sum: null, judgement: null, compared: null, thinkSo: false,
  person: 'Ada', at: '2026-03-02T09:00:00.000Z', receivedAt: '2026-03-02T09:00:00.000Z', late: false, current: true, notes: [], ...more,
});

const state = (more: Partial<CaseState> = {}): CaseState => ({
  caseId: 'case', version: 4, status: 'open', runId: 'run', at: null, differs: false, vehicleState: {}, causes: [], fit: { fits: true } as CaseState['fit'],
  suspicion: {} as CaseState['suspicion'], because: null, findings: [], next: { suggestions: [], stop: false, stopReason: null, spoiled: [] }, repairs: [],
  acknowledged: [], ...more,
} as CaseState);

const rulebook = {
  checks: { drain: { name: 'Drain', setUp: { engine: 'idle' }, answers: [{ id: 'yes', label: 'Yes' }, { id: 'no', label: 'No' }], unitSymbol: null }, time: { name: 'Time', setUp: {}, answers: [], unitSymbol: 's' } },
  panels: [], causes: {}, cautions: {},
} as unknown as RulebookView;

const common = { personId: 'me', organisationId: 'fleet', caseId: 'case', refusal: null };
const when = { deviceAt: '2026-03-02T09:05:00.000Z', clockOffsetMs: 0 };
const answered = (id: string, checkId: string, more: Partial<Kept> = {}): Kept =>
  ({ ...common, order: 1, kind: 'finding', id, body: { id, checkId, answer: { kind: 'state', state: 'yes', sureness: 'sure' }, ...when }, ...more }) as Kept;

describe('a state with what waits on the device', () => {
  test('is itself when nothing waits', () => {
    const held = state();
    expect(withWaiting(held, [], rulebook)).toBe(held);
  });

  test('shows an answer that no ranking has seen yet, over the one that it changes', () => {
    const shown = withWaiting(state({ findings: [finding('old', 'drain')] }), [answered('new', 'drain')], rulebook);
    expect(shown.findings.map(({ id, answer, current, waits }) => ({ id, answer, current, waits }))).toEqual([
      { id: 'new', answer: 'Yes', current: true, waits: true },
      { id: 'old', answer: 'No', current: false, waits: false },
    ]);
  });

  test('asks no more for what was just answered', () => {
    const suggestion = (checkId: string) => ({ checkIds: [checkId], panelId: null, word: '', bits: 1, minutes: 1, setUpMinutes: 0, because: null });
    const held = state({ next: { suggestions: [suggestion('drain'), suggestion('time')], stop: false, stopReason: null, spoiled: [] } });
    expect(withWaiting(held, [answered('new', 'drain')], rulebook).next.suggestions.map(({ checkIds }) => checkIds[0])).toEqual(['time']);
  });

  test('marks what the device’s own ranking holds already, and shows it once', () => {
    const shown = withWaiting(state({ findings: [finding('new', 'drain')] }), [answered('new', 'drain')], rulebook);
    expect(shown.findings.map(({ id, waits }) => ({ id, waits }))).toEqual([{ id: 'new', waits: true }]);
  });

  test('no longer marks what the server has, nor what it refused', () => {
    const shown = withWaiting(state({ findings: [finding('new', 'drain')] }), [answered('new', 'drain', { sentAt: 1 }), answered('bad', 'drain', { refusal: { message: 'No.', fields: {} } })], rulebook);
    expect(shown.findings.map(({ id, waits }) => ({ id, waits }))).toEqual([{ id: 'new', waits: false }]);
  });

  test('counts a caution as read, in the danger of its check, and puts a note beside its finding', () => {
    const shown = withWaiting(
      state({ findings: [finding('old', 'drain')] }),
      [
        { ...common, order: 1, kind: 'acknowledgement', id: 'a', body: { checkId: 'drain', cautions: [{ id: 'a1', cautionId: 'hot' }], ...when } },
        { ...common, order: 2, kind: 'note', id: 'n', findingId: 'old', body: { id: 'n', text: 'Black.' } },
      ],
      rulebook,
    );
    expect(shown.acknowledged).toEqual([{ cautionId: 'hot', dangers: ['engine-running'] }]);
    expect(shown.findings[0]?.notes).toMatchObject([{ id: 'n', text: 'Black.', waits: true }]);
  });
});

describe('the server’s word on a provisional ranking', () => {
  const causes = (p: number) => [{ causeId: 'drain-choked', p, change: null, prior: 0.1 }, { causeId: 'rings-worn', p: 1 - p, change: null, prior: 0.1 }];
  test('is no news when it is the same but for the last digits', () => {
    expect(differenceOf(state({ causes: causes(0.4) }), state({ causes: causes(0.4 + 1e-13) }))).toBeNull();
  });
  test('names the cause that differs most, and who answered meanwhile', () => {
    const shown = state({ causes: causes(0.4), findings: [finding('mine', 'drain')] });
    const fresh = state({ version: 9, causes: causes(0.1), findings: [finding('theirs', 'time', { person: 'Grace' }), finding('mine', 'drain')] });
    expect(differenceOf(shown, fresh)).toEqual({ version: 9, causeId: 'drain-choked', was: 0.4, is: 0.1, others: ['Grace'] });
  });
});
