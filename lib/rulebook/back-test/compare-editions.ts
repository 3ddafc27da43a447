import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { ProvedCase } from '../proved-case';
import { prepareCases } from './prepare';
import { caseScore, pairedDifference, Tally, type PairedDifference, type Scores } from './tally';

/** What it would mean for the proved cases to publish a draft. */
export interface EditionsCompared {
  before: Scores | undefined;
  after: Scores | undefined;
  /** Draft less published, over the cases that both can rank. */
  logLoss: PairedDifference;
  brier: PairedDifference;
  /** Log loss is worse by more than a standard error: publishing needs a written reason. */
  worse: boolean;
  /** Cases whose leading cause changes, in the order given. */
  leaders: { caseId: string; truth: string; from: string; to: string }[];
  /** Cases that one of the two can't be tried on, and findings that the draft has no place for. */
  notTried: { caseId: string; lacks: 'published' | 'draft' }[];
  findingsLost: readonly { caseId: string; checkId: string }[];
}

/**
 * Ranks every proved case by a published rulebook and by a draft.
 *
 * @param published,draft compiled rulebooks
 * @param cases proved cases
 * @returns scores of both over the same cases, and where they part
 * @example compareEditions(published, draft, cases).worse
 */
export function compareEditions(published: CompiledRulebook, draft: CompiledRulebook, cases: readonly ProvedCase[]): EditionsCompared {
  const [was, is] = [prepareCases(published, cases), prepareCases(draft, cases)];
  const now = new Map(is.cases.map((each) => [each.id, each]));
  const [before, after] = [new Tally(), new Tally()];
  const sums = { logLoss: [0, 0], brier: [0, 0] } satisfies Record<string, [number, number]>;
  const leaders: EditionsCompared['leaders'] = [];
  for (const old of was.cases) {
    const own = now.get(old.id);
    if (!own) continue;
    const [one, two] = [caseScore(old.scores, old.posterior, old.truth), caseScore(own.scores, own.posterior, own.truth)];
    before.add(one);
    after.add(two);
    for (const key of ['logLoss', 'brier'] as const) {
      const difference = two[key] - one[key];
      sums[key][0] += difference;
      sums[key][1] += difference * difference;
    }
    const [from, to] = [published.causeIds[one.leader] ?? '', draft.causeIds[two.leader] ?? ''];
    if (from !== to) leaders.push({ caseId: old.id, truth: published.causeIds[old.truth] ?? '', from, to });
  }
  const logLoss = pairedDifference(sums.logLoss[0], sums.logLoss[1], before.cases);
  return {
    before: before.scores(),
    after: after.scores(),
    logLoss,
    brier: pairedDifference(sums.brier[0], sums.brier[1], before.cases),
    worse: logLoss.mean > logLoss.standardError && logLoss.mean > 0,
    leaders,
    notTried: [
      ...was.unknownCause.map((caseId) => ({ caseId, lacks: 'published' as const })),
      ...is.unknownCause.filter((id) => !was.unknownCause.includes(id)).map((caseId) => ({ caseId, lacks: 'draft' as const })),
    ],
    findingsLost: is.unknownFindings,
  };
}
