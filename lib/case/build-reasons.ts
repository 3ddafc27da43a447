import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { RankOptions } from '@/lib/diagnose/rank';
import type { Finding } from '@/lib/diagnose/types';
import { explain } from '@/lib/diagnose/explain';
import { rankPairs } from '@/lib/diagnose/pairs';
import type { CaseReasons } from '@/lib/schemas/case-view';
import type { StateParts } from './build-state';
import { findingsForRanking, rankOptions } from './findings-for-ranking';
import { reasonViews } from './view/causes';
import { findingViews } from './view/findings';
import { whatSettles } from './view/settle';

/** Why the causes of a case stand where they stand: pure, and of the same parts as its state. */
export function buildReasons({ compiled, head, rows, notes, run, units }: StateParts): CaseReasons {
  const findings = findingsForRanking(rows);
  const options = rankOptions(findings, run.recordFacts);
  return {
    version: head.version,
    causes: reasonViews(compiled, explain(compiled, findings, options), findingViews(compiled, rows, notes, units)),
    settle: whatSettles(compiled, findings, options),
    pair: pairView(compiled, findings, options),
  };
}

function pairView(compiled: CompiledRulebook, findings: Finding[], options: RankOptions): CaseReasons['pair'] {
  const { offered, pairs } = rankPairs(compiled, findings, options);
  const [best] = pairs;
  return offered && best ? { causeIds: [...best.causeIds], leadDecibans: best.aheadDecibans } : null;
}
