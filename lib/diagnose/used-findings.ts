import type { CompiledCheck, CompiledRulebook } from './compiled';
import { dominantState } from './dominant-state';
import { FindingError } from './errors';
import { sortedBy } from './order';
import type { RuleFacts } from './predicates';
import { stageKey } from './stages';
import type { Finding, Stage } from './types';

/** A finding that counts in a ranking, looked up and checked. */
export interface UsedFinding {
  finding: Finding;
  check: CompiledCheck;
  /** States with a share, lower ones first. */
  states: readonly { index: number; share: number }[];
  /** Index of the state with the largest share: what compound rules see. */
  dominant: number;
}

/** Stages a ranking uses when it is not told otherwise. */
export const DIAGNOSIS_ONLY: readonly Stage[] = [{ kind: 'diagnosis' }];

/** How far the shares of a finding may be off 1: what a sum of a few roundings can do, and no more. */
const SHARES_WITHIN = 1e-9;

/**
 * The findings that a ranking uses: those of the stages asked for which say something, sorted by check. A finding
 * that says nothing (can't tell, skipped) is dropped here, so that it can't reach any number.
 *
 * @param compiled the rulebook
 * @param findings current findings of a case, in any order; not changed
 * @param stages stages to use; by default diagnosis alone, since a reading after a repair is of another vehicle
 * @returns the findings, sorted by check id
 * @throws FindingError for a check or state that the rulebook lacks, shares that do not sum to 1, a reliability
 * outside (0, 1], or a check answered twice within the stages
 */
export function usedFindings(
  compiled: CompiledRulebook,
  findings: readonly Finding[],
  stages: readonly Stage[] = DIAGNOSIS_ONLY,
): UsedFinding[] {
  const wanted = new Set(stages.map(stageKey));
  const used = sortedBy(
    findings.filter((finding) => finding.shares.length > 0 && wanted.has(stageKey(finding.stage))),
    (finding) => finding.checkId,
  );
  used.forEach((finding, index) => {
    const before = used[index - 1];
    if (before?.checkId === finding.checkId) {
      const where = `${stageKey(before.stage)} and ${stageKey(finding.stage)}`;
      throw new FindingError('answered-twice', finding.checkId, `"${finding.checkId}" is answered twice (${where}); rank one of them`);
    }
  });
  return used.map((finding) => lookUp(compiled, finding));
}

function lookUp(compiled: CompiledRulebook, finding: Finding): UsedFinding {
  const { checkId, shares, reliability } = finding;
  const check = compiled.checks.get(checkId);
  if (!check) throw new FindingError('unknown-check', checkId, `the rulebook has no check "${checkId}"`);
  if (!(reliability > 0 && reliability <= 1)) {
    throw new FindingError('bad-reliability', checkId, `reliability of "${checkId}" is ${reliability}, not in (0, 1]`);
  }
  const states = shares
    .map(({ state, share }) => {
      const index = check.stateIndex.get(state);
      if (index === undefined) {
        throw new FindingError('unknown-state', checkId, `"${checkId}" has no answer "${state}", only ${check.stateIds.join(', ')}`);
      }
      return { index, share };
    })
    .sort((a, b) => a.index - b.index);
  const sum = states.reduce((total, { share }) => total + share, 0);
  const repeated = states.some(({ index }, i) => index === states[i - 1]?.index);
  if (repeated || states.some(({ share }) => !(share > 0)) || Math.abs(sum - 1) > SHARES_WITHIN) {
    throw new FindingError('bad-shares', checkId, `shares of "${checkId}" must be positive, of different answers, and sum to 1`);
  }
  return { finding, check, states, dominant: dominantState(states) };
}

/** What rules see of the findings: for each check the state with the largest share. */
export function factsOf(used: readonly UsedFinding[]): RuleFacts {
  return new Map(used.map(({ check, dominant }) => [check.id, check.facts[dominant] ?? '']));
}
