import type { CaseState, FindingView } from '@/lib/schemas/case-view';

export interface ComparedCause {
  causeId: string;
  before: number;
  after: number;
  /** In places of the ranking; positive: it rose. */
  places: number;
}

export interface Comparison {
  /** By what stands higher afterwards; only causes with a share worth naming at either moment. */
  causes: ComparedCause[];
  /** Of all others together. */
  rest: { before: number; after: number };
  /** What was answered after the first moment and up to the second, in the order it was received. */
  answered: FindingView[];
}

/** Under this at both moments a cause is one of "the others". */
const WORTH_NAMING = 0.03;

/** Two moments of one case beside each other; `before` is the earlier one. */
export function compareStates(before: CaseState, after: CaseState): Comparison {
  const placeBefore = new Map(before.causes.map(({ causeId }, place) => [causeId, place]));
  const shareBefore = new Map(before.causes.map(({ causeId, p }) => [causeId, p]));
  const all = after.causes.map(({ causeId, p }, place) => ({
    causeId,
    before: shareBefore.get(causeId) ?? 0,
    after: p,
    places: (placeBefore.get(causeId) ?? place) - place,
  }));
  const isNamed = (cause: ComparedCause) => Math.max(cause.before, cause.after) >= WORTH_NAMING;
  const rest = all.filter((cause) => !isNamed(cause));
  const sum = (of: 'before' | 'after') => rest.reduce((total, cause) => total + cause[of], 0);
  const known = new Set(before.findings.map(({ id }) => id));
  return {
    causes: all.filter(isNamed),
    rest: { before: sum('before'), after: sum('after') },
    answered: after.findings
      .filter(({ id, source }) => !known.has(id) && source !== 'record')
      .sort((a, b) => (a.receivedAt < b.receivedAt ? -1 : 1)),
  };
}
