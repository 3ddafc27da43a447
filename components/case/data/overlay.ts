import { dangersOf } from '@/lib/diagnose/cautions';
import type { Kept } from '@/lib/offline/waiting';
import type { CaseState, FindingView, RulebookView } from '@/lib/schemas/case-view';

/**
 * A state with what was done on this device and hasn't come back with it yet: cautions that were read, notes, and
 * answers, each saying that it waits. The ranking stays that of the state.
 */
export function withWaiting(state: CaseState, waiting: readonly Kept[], rulebook: RulebookView): CaseState {
  const taken = waiting.filter(({ refusal }) => refusal === null);
  if (taken.length === 0) return state;
  const unsent = new Set(taken.filter(({ sentAt }) => sentAt === undefined).map(({ id }) => id));
  const held = new Set(state.findings.map(({ id }) => id));
  const here = taken.flatMap((item) => (item.kind === 'finding' && !held.has(item.id) && unsent.has(item.id) ? [viewOf(item, rulebook)] : []));
  const replaced = new Set(here.map(({ checkId }) => checkId));
  return {
    ...state,
    acknowledged: [
      ...state.acknowledged,
      ...taken.flatMap((item) =>
        item.kind === 'acknowledgement'
          ? item.body.cautions.map(({ cautionId }) => ({ cautionId, dangers: dangersOf(rulebook.checks[item.body.checkId]?.setUp ?? {}) }))
          : [],
      ),
    ],
    findings: [...here.reverse(), ...state.findings].map((finding) => ({
      ...finding,
      current: finding.current && (!replaced.has(finding.checkId) || here.some(({ id }) => id === finding.id)),
      waits: unsent.has(finding.id),
      notes: withNotes(finding, taken, unsent),
    })),
    next: { ...state.next, suggestions: state.next.suggestions.filter(({ checkIds }) => !checkIds.some((id) => replaced.has(id))) },
  };
}

/** An answer that no ranking has seen yet: shown as it was given. */
function viewOf({ id, body }: Extract<Kept, { kind: 'finding' }>, rulebook: RulebookView): FindingView {
  const { answer, checkId, deviceAt } = body;
  const labels: Record<string, string> = { 'cannot-tell': 'Can’t tell', sum: 'Worked out on the bench', skip: 'Skipped', undo: 'Taken back' };
  const check = rulebook.checks[checkId];
  const words =
    answer.kind === 'state' ? (check?.answers.find((one) => one.id === answer.state)?.label ?? answer.state)
    : answer.kind === 'measured' ? `${answer.value}${/[a-z%°"]/i.test(answer.value) ? '' : ` ${check?.unitSymbol ?? ''}`}`
    : (labels[answer.kind] ?? '');
  return {
    id,
    checkId,
    stage: { kind: 'diagnosis' },
    source: answer.kind === 'sum' ? 'sum' : 'asked',
    kind: answer.kind,
    answer: words,
    shares: answer.kind === 'state' ? [{ state: answer.state, share: 1 }] : [],
    sum: null,
    judgement: null,
    compared: null,
    thinkSo: 'sureness' in answer && answer.sureness === 'think-so',
    person: 'you',
    at: deviceAt,
    receivedAt: deviceAt,
    late: false,
    current: answer.kind !== 'undo',
    notes: [],
  };
}

function withNotes(finding: FindingView, taken: readonly Kept[], unsent: ReadonlySet<string>): FindingView['notes'] {
  const held = new Set(finding.notes.map(({ id }) => id));
  return [
    ...finding.notes.map((note) => ({ ...note, waits: unsent.has(note.id) })),
    ...taken.flatMap((item) =>
      item.kind === 'note' && item.findingId === finding.id && !held.has(item.id)
        ? [{ id: item.id, text: item.body.text, person: 'you', at: finding.at, waits: unsent.has(item.id) }]
        : [],
    ),
  ];
}
