import type { CompiledCheck, CompiledRulebook } from '@/lib/diagnose/compiled';
import { decibansOf } from '@/lib/diagnose/decibans';
import { SOMETHING_ELSE, type Basis } from '@/lib/diagnose/types';
import { blocksOf, type Block } from './blocks';
import { countAnswers, countKey, type AnswerCounts } from './counts';
import { believed, meanShares, weightBelief, type Dirichlet } from './dirichlet';
import type { PreparedCases } from '../back-test/prepare';
import { Z_95, type Interval } from './small-laws';

/** How many cases a weight is worth that nobody has counted: a guess, experience, a document. */
export const STRENGTH_OF: Readonly<Record<Basis, number>> = { judgement: 4, 'common practice': 10, regulation: 30 };

/** One weight as proved cases would have it. */
export interface LearnedWeight {
  rule: string;
  checkId: string;
  causeId: string;
  /** Decibans: as the rulebook has it, and ln(theta / b). */
  now: number;
  learned: number;
  /** 95 %, decibans, around the mean of the belief (which lies a little below `learned`: the scale is logarithmic). */
  interval: Interval;
  mean: number;
  standardDeviation: number;
  /** Cases of the cause with the rule's answers, and all of them with the check answered. */
  counts: { given: number; of: number };
  caseIds: readonly string[];
}

export interface LearnOptions {
  /** m of a row, from the basis of the rules that weigh its cause; by default the least of {@link STRENGTH_OF}. */
  strength?: (check: CompiledCheck, causeId: string) => number;
  /** By check: cases by answer over all cases, proved or not. Then the background rate too is a belief, worth as much. */
  backgroundCounts?: Readonly<Record<string, readonly number[]>>;
}

/**
 * Learns every weight of the single-check tables from proved cases: theta = (n_cv + m theta0) / (n_c + m), w = ln(theta / b),
 * with an interval from the Dirichlet belief. No gate: what is worth proposing is `proposals`' to say. "Something else" is
 * the reference and learns nothing.
 *
 * @param prepared proved cases, prepared with the rulebook that is to learn
 * @returns one entry for each weight, in the order of causes, checks and rules
 * @example learnWeights(prepared)[0]?.interval
 */
export function learnWeights({ compiled, cases }: PreparedCases, options: LearnOptions = {}): LearnedWeight[] {
  const counts = countAnswers(cases);
  const { strength = leastStrength(compiled), backgroundCounts } = options;
  return compiled.causeIds.flatMap((causeId, cause) => {
    if (causeId === SOMETHING_ELSE) return [];
    return [...compiled.checks.values()].flatMap((check) => {
      const blocks = blocksOf(check, causeId);
      if (blocks.length === 0) return [];
      const m = strength(check, causeId);
      const counted = counts.get(countKey(cause, check.id));
      const row = rowBelief(blocks, counted?.byState ?? [], m);
      const seen = backgroundCounts?.[check.id];
      const background = seen && believed(inBlocks(blocks, seen), blocks.map((block) => block.background), m);
      return blocks.flatMap((block, index) => weightsOf(block, index, { checkId: check.id, causeId, row, background, counted }));
    });
  });
}

/** Belief about the shares of a row's blocks, given counts by answer. */
export function rowBelief(blocks: readonly Block[], byState: readonly number[], m: number): Dirichlet {
  const sum = blocks.reduce((total, { share }) => total + share, 0);
  return believed(inBlocks(blocks, byState), blocks.map(({ share }) => share / sum), m);
}

/** Counts of answers as counts of blocks. */
function inBlocks(blocks: readonly Block[], byState: readonly number[]): number[] {
  return blocks.map(({ states }) => states.reduce((sum, state) => sum + (byState[state] ?? 0), 0));
}

/** ln(theta / b) of a block, decibans. */
export function learnedDecibans(block: Block, index: number, row: Dirichlet): number {
  return decibansOf(Math.log((meanShares(row)[index] ?? 0) / block.background));
}

interface Context {
  checkId: string;
  causeId: string;
  row: Dirichlet;
  background: Dirichlet | undefined;
  counted: AnswerCounts | undefined;
}

function weightsOf(block: Block, index: number, { checkId, causeId, row, background, counted }: Context): LearnedWeight[] {
  const { rule, decibans } = block;
  if (rule === undefined || decibans === undefined) return [];
  const part = (belief: Dirichlet) => ({ alpha: belief.alphas[index] ?? 0, total: belief.total });
  const belief = weightBelief(part(row), background ? part(background) : { rate: block.background });
  const [mean, standardDeviation] = [decibansOf(belief.mean), decibansOf(belief.standardDeviation)];
  return [
    {
      rule,
      checkId,
      causeId,
      now: decibans,
      learned: learnedDecibans(block, index, row),
      interval: { low: mean - Z_95 * standardDeviation, high: mean + Z_95 * standardDeviation },
      mean,
      standardDeviation,
      counts: { given: block.states.reduce((sum, state) => sum + (counted?.byState[state] ?? 0), 0), of: counted?.cases ?? 0 },
      caseIds: counted?.caseIds ?? [],
    },
  ];
}

/** A row is as strong as the weakest of the rules that make it. */
export function leastStrength(compiled: CompiledRulebook): (check: CompiledCheck, causeId: string) => number {
  return (check, causeId) => {
    const rules = check.tableRules.filter(({ rule }) => Object.hasOwn(rule.weights, causeId));
    return Math.min(...rules.map(({ name }) => STRENGTH_OF[compiled.rules.get(name)?.rule.basis ?? 'judgement']));
  };
}
