/** The checks of a case that can still be asked, each with what asking it would bring. */
import { forecast, likelihoods, type Forecast } from './information';
import { stageKey } from './stages';
import type { Check, Finding, Stage } from './types';
import { DIAGNOSIS_ONLY } from './used-findings';
import type { WhatIf } from './what-if';

export interface OpenCheck {
  check: Check;
  /** W by state, then by cause, nats. */
  logWeights: readonly Float64Array[];
  forecast: Forecast;
}

export interface OpenChecks {
  whatIf: WhatIf;
  /** By id, in the order of ids. */
  checks: ReadonlyMap<string, OpenCheck>;
  /** Unanswered, but made worthless by a check that was made already. */
  spoiled: { checkId: string; by: string }[];
}

/**
 * Forecasts every check that is still open: not answered, not set aside (can't tell, skipped), not spoiled. A check
 * that was set aside counts as not made, so what it would have spoiled stays open: offering something that turns out
 * to be gone costs one "can't tell", hiding something that is still there costs its evidence.
 *
 * @param whatIf from `createWhatIf` with the same findings and stages
 * @param findings current findings, those that say nothing included
 * @param stages stages that count; by default diagnosis alone
 * @returns open checks with their forecasts, and those that are spoiled
 * @example openChecks(createWhatIf(compiled, findings), findings).checks.get('noise')?.forecast.bits
 */
export function openChecks(
  whatIf: WhatIf,
  findings: readonly Finding[],
  stages: readonly Stage[] = DIAGNOSIS_ONLY,
): OpenChecks {
  const wanted = new Set(stages.map(stageKey));
  const dealtWith = new Set(findings.filter(({ stage }) => wanted.has(stageKey(stage))).map(({ checkId }) => checkId));
  const spoiledBy = new Map<string, string>();
  for (const by of whatIf.answered) {
    for (const checkId of whatIf.compiled.checks.get(by)?.check.spoils ?? []) spoiledBy.set(checkId, by);
  }
  const checks = new Map<string, OpenCheck>();
  const spoiled: OpenChecks['spoiled'] = [];
  for (const { id, check, stateIds, backgrounds } of whatIf.compiled.checks.values()) {
    if (dealtWith.has(id) || whatIf.answered.has(id)) continue;
    const by = spoiledBy.get(id);
    if (by !== undefined) {
      spoiled.push({ checkId: id, by });
      continue;
    }
    const logWeights = stateIds.map((state) => whatIf.logWeights(id, state));
    checks.set(id, { check, logWeights, forecast: forecast(whatIf.posterior, likelihoods(backgrounds, logWeights)) });
  }
  return { whatIf, checks, spoiled };
}

/** Two open checks that a compound rule joins: together they can tell more than apart. */
export interface OpenPair {
  checkIds: readonly [string, string];
  forecast: Forecast;
}

/**
 * Forecasts every two open checks that a compound rule mentions together. Given one cause, no other two tell more
 * together than apart.
 *
 * @param open from {@link openChecks}
 * @returns pairs in the order of ids
 * @example openPairs(open)[0]?.forecast.bits
 */
export function openPairs({ whatIf, checks }: OpenChecks): OpenPair[] {
  const joined = new Map<string, readonly [string, string]>();
  for (const { checkIds } of whatIf.compiled.compoundRules) {
    const open = checkIds.filter((id) => checks.has(id));
    open.forEach((a, i) => open.slice(i + 1).forEach((b) => joined.set(`${a} ${b}`, [a, b])));
  }
  return [...joined.values()].map(([a, b]) => {
    const statesA = whatIf.compiled.checks.get(a);
    const statesB = whatIf.compiled.checks.get(b);
    const background: number[] = [];
    const logWeights: Float64Array[] = [];
    statesA?.stateIds.forEach((stateA, i) => {
      statesB?.stateIds.forEach((stateB, k) => {
        background.push((statesA.backgrounds[i] ?? 0) * (statesB.backgrounds[k] ?? 0));
        logWeights.push(whatIf.logWeightsPair(a, stateA, b, stateB));
      });
    });
    return { checkIds: [a, b], forecast: forecast(whatIf.posterior, likelihoods(background, logWeights)) };
  });
}
