import { describe, expect, it } from 'vitest';
import { releaseHolds } from '@/lib/case/release-holds';
import { compileRulebook, parseRulebook, type Stage } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';

const compiled = compileRulebook(defaultRulebook);
const DIAGNOSIS: Stage = { kind: 'diagnosis' };
let minute = 0;

/** The answers of one check, in the order given. */
function answers(checkId: string, ...given: (string | { kind: string } | { shares: Record<string, number> } | { state: string; stage: Stage })[]) {
  return given.map((one) => {
    minute += 1;
    const at = new Date(Date.UTC(2026, 0, 1, 8, minute));
    const shares = typeof one === 'string' ? { [one]: 1 } : 'shares' in one ? one.shares : 'state' in one ? { [one.state]: 1 } : {};
    return {
      id: `id-${String(minute).padStart(4, '0')}`,
      checkId,
      stage: typeof one === 'object' && 'stage' in one ? one.stage : DIAGNOSIS,
      kind: typeof one === 'object' && 'kind' in one ? one.kind : 'state',
      shares: Object.entries(shares).map(([state, share]) => ({ state, share })),
      correctedAt: at,
      receivedAt: at,
    };
  });
}

describe('which answers forbid a release', () => {
  it.each([
    ['oil-in-service-tanks', 'yes'],
    ['oil-at-valves', 'yes'],
    ['leak-down-released', '2-to-3'],
    ['leak-down-applied', 'over-7'],
    ['build-up-time', 'very-slow'],
    ['cut-in-pressure', 'under-85'],
    ['air-delivery', 'none'],
  ])('%s: %s', (check, state) => expect(releaseHolds(compiled, answers(check, state))).toEqual([check]));

  it.each([
    ['oil-in-wet-tank', 'yes'],
    ['leak-down-released', 'under-2'],
    ['build-up-time', 'slow'],
    ['cut-in-pressure', '85-to-100'],
    ['cut-out-pressure', 'high'],
  ])('not %s: %s', (check, state) => expect(releaseHolds(compiled, answers(check, state))).toEqual([]));

  it('names them all, whatever order they came in', () => {
    const rows = [...answers('oil-at-valves', 'yes'), ...answers('leak-down-applied', '4-to-7'), ...answers('noise', 'none')];
    expect(releaseHolds(compiled, rows)).toEqual(['leak-down-applied', 'oil-at-valves']);
    expect(releaseHolds(compiled, rows.toReversed())).toEqual(['leak-down-applied', 'oil-at-valves']);
  });

  it('takes a measured value on the edge of a limit for one over it', () => {
    expect(releaseHolds(compiled, answers('leak-down-released', { shares: { 'under-2': 0.5, '2-to-3': 0.5 } }))).toEqual(['leak-down-released']);
    expect(releaseHolds(compiled, answers('leak-down-released', { shares: { 'under-2': 0.6, '2-to-3': 0.4 } }))).toEqual([]);
  });
});

describe('what lifts it', () => {
  const held = ['oil-in-service-tanks'];
  it.each([
    ['a later answer that passes', ['yes', 'no'], []],
    ['one that passes at another stage', ['yes', { state: 'no', stage: { kind: 'release' } as Stage }], []],
    ['not one that passed before', ['no', 'yes'], held],
    ['not "can’t tell"', ['yes', { kind: 'cannot-tell' }], held],
    ['not skipping the check', ['yes', { kind: 'skip' }], held],
    ['taking the answer back', ['yes', { kind: 'undo' }], []],
    ['not taking back the answer that passed', ['yes', 'no', { kind: 'undo' }], held],
    ['not taking back a "can’t tell"', ['yes', { kind: 'cannot-tell' }, { kind: 'undo' }], held],
  ] as const)('%s', (_, given, expected) => expect(releaseHolds(compiled, answers('oil-in-service-tanks', ...given))).toEqual(expected));

  it('leaves an answer of another stage alone when one is taken back', () => {
    const rows = answers('oil-in-service-tanks', 'yes', { state: 'yes', stage: { kind: 'release' } });
    const [undo] = answers('oil-in-service-tanks', { kind: 'undo' });
    expect(releaseHolds(compiled, undo ? [...rows, undo] : [])).toEqual(held);
  });
});

describe('a rulebook', () => {
  const withStates = (change: (state: object) => object) => ({
    ...defaultRulebook,
    checks: defaultRulebook.checks.map((check) => (check.id === 'oil-at-valves' ? { ...check, states: check.states.map((state) => change(state)) } : check)),
  });
  const problemsOf = (book: unknown) => {
    const parsed = parseRulebook(book);
    return parsed.ok ? [] : parsed.problems.map(({ path, message }) => `${path}: ${message}`);
  };

  it('may not hold a release by every answer of a check', () => {
    expect(problemsOf(withStates((state) => ({ ...state, holdsRelease: true })))).toEqual([
      expect.stringMatching(/checks\[\d+\]\.states: every answer of "oil-at-valves" holds the release/),
    ]);
  });

  it('says true or nothing', () => {
    expect(problemsOf(withStates((state) => ({ ...state, holdsRelease: false })))).not.toEqual([]);
  });
});
