import { notEstimable, onLogScale, Z_95, type NotEstimable, type OneSided, type TwoSided } from '../result';
import { rootBeyond } from '../special/root';
import { rowAt } from '../spells/risk-table';
import { everAtRisk, type Spell } from '../spells/spell';
import { jointRows, type JointRow, type TwoGroups } from './two-groups';

/** A spell and the unit that gave it: spells of one unit are alike. */
export interface ClusteredSpell extends Spell {
  readonly cluster?: string;
}

export type Ties = 'efron' | 'breslow';

export interface Cox {
  readonly kind: 'estimated';
  /** Of failing, treated to others, at any age. */
  readonly hazardRatio: number;
  readonly logRatio: number;
  /** Of its logarithm: robust when spells name their unit. */
  readonly standardError: number;
  readonly robust: boolean;
  readonly limits: TwoSided | OneSided;
  /** Likelihood ratio against no difference, one degree of freedom. */
  readonly chiSquared: number;
}

export type CoxWhy = 'no-failures' | 'no-failures-in-one-group' | 'no-likeliest-ratio';

/**
 * Cox's proportional hazards of two groups, stratified: each stratum has a hazard of its own.
 *
 * @returns not estimable when one group has no failures: the ratio would be 0 or without end. Say "no failures", with the
 *   p-value of the log-rank test
 * @throws RangeError for illegal spells
 * @see D. R. Cox 1972; B. Efron 1977; D. Y. Lin and L. J. Wei 1989 for the robust error
 * @example cox([{ treated, others }]) // hazardRatio 0.208, limits 0.093 to 0.466
 */
export function cox(strata: readonly TwoGroups<ClusteredSpell>[], { ties = 'efron', z = Z_95 }: { ties?: Ties; z?: number } = {}): Cox | NotEstimable<CoxWhy> {
  const tables = strata.map(jointRows);
  const rows = tables.flat();
  const [treated, all] = [rows.reduce((sum, row) => sum + row.treatedFailed, 0), rows.reduce((sum, row) => sum + row.failed, 0)];
  if (all === 0) return notEstimable('no-failures');
  if (treated === 0 || treated === all) return notEstimable('no-failures-in-one-group');

  const at = (logRatio: number) => partial(rows, logRatio, ties);
  const start = at(0).score;
  const logRatio = rootBeyond((b) => at(b).score, 0, start > 0 ? 0.25 : -0.25, 7);
  if (logRatio === undefined) return notEstimable('no-likeliest-ratio');
  const { information, logLikelihood } = at(logRatio);
  if (!(information > 0)) return notEstimable('no-likeliest-ratio');
  const robust = strata.some((stratum) => [...stratum.treated, ...stratum.others].some(({ cluster }) => cluster !== undefined));
  const standardError = robust ? Math.sqrt(squaredScores(strata, tables, logRatio, ties)) / information : 1 / Math.sqrt(information);
  const hazardRatio = Math.exp(logRatio);
  return {
    kind: 'estimated',
    hazardRatio,
    logRatio,
    standardError,
    robust,
    limits: onLogScale(hazardRatio, standardError, z),
    chiSquared: 2 * (logLikelihood - at(0).logLikelihood),
  };
}

/** What is at risk at the k-th of several failures at one age: Efron takes out k of d of those who failed. */
function terms(row: JointRow, ratio: number, ties: Ties): { weight: number; share: number; left: number }[] {
  const others = { atRisk: row.atRisk - row.treatedAtRisk, failed: row.failed - row.treatedFailed };
  return Array.from({ length: row.failed }, (_, k) => {
    const out = ties === 'efron' ? k / row.failed : 0;
    const treated = (row.treatedAtRisk - out * row.treatedFailed) * ratio;
    const weight = treated + others.atRisk - out * others.failed;
    return { weight, share: treated / weight, left: 1 - out };
  });
}

function partial(rows: readonly JointRow[], logRatio: number, ties: Ties) {
  const ratio = Math.exp(logRatio);
  let [score, information, logLikelihood] = [0, 0, 0];
  for (const row of rows) {
    score += row.treatedFailed;
    logLikelihood += row.treatedFailed * logRatio;
    for (const { weight, share } of terms(row, ratio, ties)) {
      score -= share;
      information += share * (1 - share);
      logLikelihood -= Math.log(weight);
    }
  }
  return { score, information, logLikelihood };
}

/** Sum over units of the square of what their spells add to the score. */
function squaredScores(strata: readonly TwoGroups<ClusteredSpell>[], tables: readonly JointRow[][], logRatio: number, ties: Ties): number {
  const ratio = Math.exp(logRatio);
  const scores = new Map<string, number>();
  let alone = 0;
  for (const [i, { treated, others }] of strata.entries()) {
    for (const [x, spells] of [[1, treated], [0, others]] as const) {
      const met = compensator(tables[i] ?? [], x, ratio, ties);
      for (const spell of spells.filter(everAtRisk)) {
        const key = spell.cluster === undefined ? `alone ${(alone += 1)}` : `unit ${spell.cluster}`;
        scores.set(key, (scores.get(key) ?? 0) + met(spell));
      }
    }
  }
  return [...scores.values()].reduce((sum, score) => sum + score * score, 0);
}

/** What a spell of a group adds to the score: at its failure, less what it was expected to over its ages at risk. */
function compensator(table: readonly JointRow[], x: 0 | 1, ratio: number, ties: Ties): (spell: Spell) => number {
  let sum = 0;
  const risk = x === 1 ? ratio : 1;
  const steps = table.map((row) => {
    const each = terms(row, ratio, ties);
    const add = each.reduce((total, { weight, share }) => total + (risk * (x - share)) / weight, 0);
    const own = each.reduce((total, { share }) => total + (x - share) / row.failed, 0);
    const ownRisk = each.reduce((total, { weight, share, left }) => total + (left * risk * (x - share)) / weight, 0);
    sum += add;
    return { age: row.age, sum, failing: own + add - ownRisk };
  });
  return ({ entryAge = 0, exitAge, failed }) => {
    const last = rowAt(steps, exitAge);
    const before = entryAge > 0 ? (rowAt(steps, entryAge)?.sum ?? 0) : 0;
    return (failed && last?.age === exitAge ? last.failing : 0) - ((last?.sum ?? 0) - before);
  };
}
