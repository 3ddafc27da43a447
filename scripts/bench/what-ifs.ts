/**
 * What-ifs of every open check by compiled predicates (A) against the production run of the rule engine for each of
 * the same answers (B), at 200 rules and 60 checks of 4 answers, 20 of them answered. Same results, or it throws.
 */
import { compileRulebook, createWhatIf, type CompiledRulebook, type Finding } from '@/lib/diagnose';
import { posteriorOf } from '@/lib/diagnose/log-sum-exp';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { benchCase } from './bench-case';

const TOLERANCE = 1e-9;

interface WhatIfCase {
  compiled: CompiledRulebook;
  findings: Finding[];
  open: { checkId: string; state: string }[];
}

function openAnswers(compiled: CompiledRulebook, findings: readonly Finding[]) {
  const answered = new Set(findings.map(({ checkId }) => checkId));
  return [...compiled.checks.values()]
    .filter(({ id }) => !answered.has(id))
    .flatMap(({ id, stateIds }) => stateIds.map((state) => ({ checkId: id, state })));
}

const byPredicates = ({ compiled, findings, open }: WhatIfCase): Float64Array[] => {
  const whatIf = createWhatIf(compiled, findings);
  return open.map(({ checkId, state }) => {
    const weights = whatIf.logWeights(checkId, state);
    return posteriorOf(whatIf.scores.map((score, c) => score + (weights[c] ?? 0)));
  });
};

async function byEngine({ compiled, findings, open }: WhatIfCase): Promise<Float64Array[]> {
  const results: Float64Array[] = [];
  for (const { checkId, state } of open) {
    const answered: Finding = { id: 'what-if', checkId, stage: { kind: 'diagnosis' }, shares: [{ state, share: 1 }], reliability: 1 };
    const { ranking } = await runOfRecord(compiled, [...findings, answered]);
    const p = new Map(ranking.causes.map((cause) => [cause.causeId, cause.p]));
    results.push(Float64Array.from(compiled.causeIds, (id) => p.get(id) ?? NaN));
  }
  return results;
}

/** Both ways over the same case, checked to agree before anything is timed. */
export async function whatIfs() {
  const { rulebook, findings } = benchCase();
  const compiled = compileRulebook(rulebook);
  const subject: WhatIfCase = { compiled, findings, open: openAnswers(compiled, findings) };
  const [fast, slow] = [byPredicates(subject), await byEngine(subject)];
  fast.forEach((posterior, i) =>
    posterior.forEach((p, c) => {
      if (!(Math.abs(p - (slow[i]?.[c] ?? NaN)) < TOLERANCE)) throw new Error(`what-if ${i} of cause ${c}: ${p} and ${slow[i]?.[c]}`);
    }),
  );
  return {
    a: () => byEngine(subject),
    b: () => byPredicates(subject),
    about: `${rulebook.rules.length} rules, ${rulebook.checks.length} checks, ${subject.open.length} what-ifs`,
  };
}
