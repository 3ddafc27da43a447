import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { attenuationFactors } from '@/lib/diagnose/attenuation';
import type { PreparedCase, PreparedCases } from '../back-test/prepare';
import { pairedDifference, type PairedDifference } from '../back-test/tally';

/** From so many proved cases on beta and rho are fitted at all. */
export const FITTED_FROM = 50;
const FOLDS = 10;
const STEP = 0.05;

export interface EvidenceSettings {
  beta: number;
  /** Of the groups that name none. */
  rho: number;
}

export type FittedSettings =
  | { kind: 'too-few'; cases: number; needs: number }
  | {
      kind: 'fitted';
      cases: number;
      now: EvidenceSettings;
      fitted: EvidenceSettings;
      /** Held-out log loss of settings fitted to the other cases, less that of the settings as they are. */
      heldOut: PairedDifference;
      /** Held-out log loss is better by a standard error or more. */
      better: boolean;
    };

/**
 * Fits beta and the default rho by held-out log loss: ten parts, each scored with what the other nine would choose. Groups
 * that name a rho of their own keep it.
 *
 * @param prepared proved cases
 * @returns a proposal on a grid of 0.05, or how many cases it needs
 * @example fitSettings(prepared).kind
 */
export function fitSettings({ compiled, cases }: PreparedCases): FittedSettings {
  if (cases.length < FITTED_FROM) return { kind: 'too-few', cases: cases.length, needs: FITTED_FROM };
  const { beta, defaultRho } = compiled.settings;
  const now = { beta, rho: defaultRho };
  const grid = everySetting();
  const layered = cases.map((each) => layersOf(compiled, each));
  const losses = grid.map((settings) => layered.map((each) => logLossAt(each, settings)));
  const best = (counts: (index: number) => boolean): number => {
    const sums = losses.map((own) => own.reduce((sum, loss, index) => (counts(index) ? sum + loss : sum), 0));
    return sums.indexOf(Math.min(...sums));
  };

  let [sum, squares] = [0, 0];
  for (let fold = 0; fold < FOLDS; fold += 1) {
    const chosen = losses[best((index) => index % FOLDS !== fold)];
    layered.forEach((each, index) => {
      if (index % FOLDS !== fold) return;
      const difference = (chosen?.[index] ?? NaN) - logLossAt(each, now);
      sum += difference;
      squares += difference * difference;
    });
  }
  const heldOut = pairedDifference(sum, squares, cases.length);
  const better = heldOut.mean < 0 && -heldOut.mean >= heldOut.standardError;
  return { kind: 'fitted', cases: cases.length, now, fitted: grid[best(() => true)] ?? now, heldOut, better };
}

function everySetting(): EvidenceSettings[] {
  const steps = (from: number, to: number) => Array.from({ length: Math.round((to - from) / STEP) + 1 }, (_, i) => Number((from + i * STEP).toFixed(2)));
  return steps(STEP, 1.5).flatMap((beta) => steps(0, 1).map((rho) => ({ beta, rho })));
}

/** A case's evidence in layers: S = ln prior + beta (fixed + sum_j layer_j rho^j), by cause. */
interface Layered {
  truth: number;
  logPriors: Float64Array;
  /** What groups with a rho of their own say. */
  fixed: Float64Array;
  /** The j-th largest weights of all other groups, for and against. */
  layers: Float64Array[];
}

function layersOf(compiled: CompiledRulebook, { truth, logPriors, items }: PreparedCase): Layered {
  const own = new Set(compiled.rulebook.evidenceGroups.flatMap(({ id, rho }) => (rho === undefined ? [] : [id])));
  const fixed = new Float64Array(logPriors.length);
  const layers: Float64Array[] = [];
  for (const groupId of new Set(items.map(({ group }) => group.id))) {
    const members = items.filter(({ group }) => group.id === groupId);
    logPriors.forEach((_, cause) => {
      const weights = members.map(({ nats }) => nats[cause] ?? 0);
      if (own.has(groupId)) {
        const factors = attenuationFactors(weights, members[0]?.group.rho ?? 1);
        weights.forEach((weight, index) => (fixed[cause] = (fixed[cause] ?? 0) + weight * (factors[index] ?? 1)));
        return;
      }
      for (const sign of [1, -1]) {
        const sorted = weights.filter((weight) => sign * weight > 0).sort((a, b) => sign * (b - a));
        sorted.forEach((weight, j) => {
          const layer = (layers[j] ??= new Float64Array(logPriors.length));
          layer[cause] = (layer[cause] ?? 0) + weight;
        });
      }
    });
  }
  return { truth, logPriors, fixed, layers };
}

function logLossAt({ truth, logPriors, fixed, layers }: Layered, { beta, rho }: EvidenceSettings): number {
  const scores = logPriors.map((logPrior, cause) => {
    let evidence = fixed[cause] ?? 0;
    layers.forEach((layer, j) => (evidence += rho ** j * (layer[cause] ?? 0)));
    return logPrior + beta * evidence;
  });
  const top = scores.reduce((a, b) => Math.max(a, b), -Infinity);
  return top + Math.log(scores.reduce((sum, score) => sum + Math.exp(score - top), 0)) - (scores[truth] ?? -Infinity);
}
