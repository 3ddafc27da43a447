import type { CompiledCheck } from '@/lib/diagnose/compiled';
import { decibansOf } from '@/lib/diagnose/decibans';
import { moveWeight, type Moved } from '../back-test/move-weight';
import type { PreparedCase, PreparedCases } from '../back-test/prepare';
import { pairedDifference, type PairedDifference } from '../back-test/tally';
import { WHY_ASKED, type WhyAsked } from '../proved-case';
import { rowOf, type Weights } from '../row';
import { blocksOf, type Block } from './blocks';
import { countsOf } from './counts';
import { chanceOfChange, heldBackBy, type HeldBack } from './gates';
import { learnedDecibans, learnWeights, leastStrength, rowBelief, type LearnedWeight, type LearnOptions } from './learn-weights';

/** A learned weight with what an engineer needs to accept it, adjust it, or decline it. */
export interface Proposal extends LearnedWeight {
  /** P(|change| > 1 dB). */
  chanceOfChange: number;
  /** Leave-one-out log loss with it less without it, nats; negative is better. */
  logLoss: PairedDifference;
  /** Other weights of the same row that must move along, decibans, so that the answers still add up to one. */
  along: Weights;
  /** Why the check was asked in the cases that teach it: answers to a check that was suggested by the very ranking that
   * they change deserve a second look. */
  asked: Readonly<Record<WhyAsked, number>>;
  /** Gates that it does not pass; empty when it is proposed. */
  heldBack: readonly HeldBack[];
  /** What accepting it would do to every proved case. */
  effect: Moved;
}

/**
 * Weighs every learned weight against the gates: too few cases, no clear change, too uncertain, too large a step, or
 * cases left out one at a time no better predicted. Nothing is changed here: a person accepts each.
 *
 * @param prepared proved cases, prepared with the rulebook that is to learn
 * @param options as for `learnWeights`
 * @returns every weight whose cause was proved at least once with the check answered; those proposed first, then by how
 * much they improve the log loss
 * @example proposals(prepared).filter(({ heldBack }) => heldBack.length === 0)
 */
export function proposals(prepared: PreparedCases, options: LearnOptions = {}): Proposal[] {
  const strength = options.strength ?? leastStrength(prepared.compiled);
  const cases = new Map(prepared.cases.map((each) => [each.id, each]));
  return learnWeights(prepared, options)
    .filter(({ counts }) => counts.of > 0)
    .map((weight) => proposalOf(prepared, cases, weight, strength))
    .sort((a, b) => a.heldBack.length - b.heldBack.length || a.logLoss.mean - b.logLoss.mean);
}

function proposalOf(prepared: PreparedCases, cases: ReadonlyMap<string, PreparedCase>, weight: LearnedWeight, strength: NonNullable<LearnOptions['strength']>): Proposal {
  const { causeId, rule, learned } = weight;
  const check = prepared.compiled.checks.get(weight.checkId);
  if (!check) throw new RangeError(`the rulebook has no check "${weight.checkId}"`);
  const moving = moveWeight(prepared, rule, causeId);
  const along = alongWith(check, causeId, rule, learned);

  const blocks = blocksOf(check, causeId);
  const index = blocks.findIndex((block) => block.rule === rule);
  const m = strength(check, causeId);
  const counts = weight.caseIds.map((id) => ownCounts(cases.get(id), check));
  const all = check.stateIds.map((_, state) => counts.reduce((sum, each) => sum + (each[state] ?? 0), 0));
  const taught = new Map(weight.caseIds.map((id, at) => [id, counts[at] ?? []]));

  let [sum, squares] = [0, 0];
  prepared.cases.forEach((each, at) => {
    const own = taught.get(each.id);
    const without = own ? learnedWithout(blocks, index, all, own, m) : learned;
    const loss = moving.logLossOf(at, { ...alongWith(check, causeId, rule, without), [rule]: without });
    const now = moving.logLossOf(at, {});
    if (loss === undefined || now === undefined) return;
    sum += loss - now;
    squares += (loss - now) ** 2;
  });
  const logLoss = pairedDifference(sum, squares, prepared.cases.length);
  return {
    ...weight,
    chanceOfChange: chanceOfChange(weight),
    logLoss,
    along,
    asked: askedIn(weight, cases),
    heldBack: heldBackBy(weight, logLoss),
    effect: moving.at(learned, along),
  };
}

const ownCounts = (prepared: PreparedCase | undefined, check: CompiledCheck): number[] => {
  const used = prepared?.used.find((each) => each.check === check);
  return used ? countsOf(used) : [];
};

/** The weight as the other cases alone would teach it, decibans. */
function learnedWithout(blocks: readonly Block[], index: number, all: readonly number[], own: readonly number[], m: number): number {
  const block = blocks[index];
  if (!block) return 0;
  // A case's counts come out of a sum of many: what rounding leaves below zero is none.
  const others = all.map((count, state) => Math.max(0, count - (own[state] ?? 0)));
  return learnedDecibans(block, index, rowBelief(blocks, others, m));
}

/**
 * The weights of a row that must move along with one of them: where the row would no longer add up to one, the other
 * answers share what the new weight leaves, in proportion.
 *
 * @returns decibans by rule; empty where the weight can move alone
 */
export function alongWith(check: CompiledCheck, causeId: string, rule: string, decibans: number): Weights {
  if (rowOf(check, causeId, { [rule]: decibans }).coherent) return {};
  const blocks = blocksOf(check, causeId);
  const own = blocks.find((block) => block.rule === rule);
  if (!own) return {};
  const share = own.background * 10 ** (decibans / 10);
  const left = decibansOf(Math.log((1 - share) / (1 - own.share)));
  return Object.fromEntries(
    blocks.flatMap((block): [string, number][] => {
      if (block === own || block.rule === undefined) return [];
      return [[block.rule, decibansOf(Math.log(block.share / block.background)) + left]];
    }),
  );
}

function askedIn({ caseIds, checkId }: LearnedWeight, cases: ReadonlyMap<string, PreparedCase>): Record<WhyAsked, number> {
  const asked = Object.fromEntries(WHY_ASKED.map((why) => [why, 0])) as Record<WhyAsked, number>;
  for (const id of caseIds) {
    const why = cases.get(id)?.asked[checkId];
    if (why) asked[why] += 1;
  }
  return asked;
}
