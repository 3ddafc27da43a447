import { largestWeight, type Weights } from '../row';
import { gainOf, movingItem, movingOf, weightAt, withoutMoving, type Beside, type Moving } from './moving';
import type { PreparedCase, PreparedCases } from './prepare';
import { caseScore, pairedDifference, Tally, type CaseScore, type PairedDifference, type Scores } from './tally';

/** What a weight would do to every proved case. */
export type Moved =
  | {
      kind: 'moved';
      scores: Scores | undefined;
      /** Log loss with the weight less without it. */
      logLoss: PairedDifference;
      /** Cases whose leading cause changes, with both leaders. */
      leaders: { caseId: string; from: string; to: string }[];
    }
  | { kind: 'incoherent'; total: number; /** Decibans; see `largestWeight`. */ largest: number | undefined };

export interface MovingWeight {
  /** How many cases it can reach. */
  reaches: number;
  /** Scores of the rulebook as it is. */
  before: Scores | undefined;
  /**
   * @param decibans the weight
   * @param others weights of other rules of the same check that move along
   */
  at(decibans: number, others?: Weights): Moved;
  /** Log loss of one case at some weights, nats; undefined where they are incoherent. */
  logLossOf(caseIndex: number, weights: Weights): number | undefined;
}

/** A case that a weight reaches, with everything that stays as it is while the weight moves. */
interface Reached {
  index: number;
  prepared: PreparedCase;
  beside: Beside;
  was: CaseScore;
  /** Of all causes but the moving one: largest score, sum of e^(S - top) and of its squares, the same for the truth. */
  top: number;
  sum: number;
  squares: number;
  /** The three highest of the others, highest first: [score, index]. */
  highest: (readonly [number, number])[];
  /** Others above the truth, when the truth is not what moves. */
  ahead: number;
}

/**
 * Makes one weight movable over prepared cases. Everything that does not move is summed up once; a position of the
 * weight then costs a few operations for each case that the rule reaches, and nothing for all others.
 *
 * @param prepared from `prepareCases`
 * @param ruleName,causeId whose weight
 * @throws RangeError for a rule or cause that the rulebook does not list
 * @example moveWeight(prepared, 'noise: knock', 'rings-worn').at(4)
 */
export function moveWeight(prepared: PreparedCases, ruleName: string, causeId: string): MovingWeight {
  const moving = movingOf(prepared.compiled, ruleName, causeId);
  const untouched = new Tally();
  const whole = new Tally();
  const reached: Reached[] = [];
  const byIndex = new Map<number, Reached>();
  const lossOfOthers = new Map<number, number>();
  prepared.cases.forEach((each, index) => {
    const was = caseScore(each.scores, each.posterior, each.truth);
    whole.add(was);
    const found = reach(moving, each, index, was);
    if (!found) {
      untouched.add(was);
      lossOfOthers.set(index, was.logLoss);
      return;
    }
    reached.push(found);
    byIndex.set(index, found);
  });

  const nowOf = (each: Reached, weight: number): CaseScore =>
    moved(moving, each, each.beside.score + moving.compiled.settings.beta * gainOf(each.beside, weight, moving.group.rho));

  return {
    reaches: reached.length,
    before: whole.scores(),
    at: (decibans, others = {}) => {
      const row = weightAt(moving, { ...others, [ruleName]: decibans });
      if (!row.coherent) {
        const largest = moving.source.kind === 'table' ? largestWeight(moving.source.check, causeId, ruleName) : undefined;
        return { kind: 'incoherent', total: row.total, largest };
      }
      const tally = untouched.copy();
      const leaders: { caseId: string; from: string; to: string }[] = [];
      let [sum, squares] = [0, 0];
      for (const each of reached) {
        const now = nowOf(each, row.of(each.prepared.used));
        tally.add(now);
        const difference = now.logLoss - each.was.logLoss;
        sum += difference;
        squares += difference * difference;
        if (now.leader !== each.was.leader) {
          const { causeIds } = moving.compiled;
          leaders.push({ caseId: each.prepared.id, from: causeIds[each.was.leader] ?? '', to: causeIds[now.leader] ?? '' });
        }
      }
      return { kind: 'moved', scores: tally.scores(), logLoss: pairedDifference(sum, squares, prepared.cases.length), leaders };
    },
    logLossOf: (caseIndex, weights) => {
      const each = byIndex.get(caseIndex);
      if (!each) return lossOfOthers.get(caseIndex);
      const row = weightAt(moving, weights);
      return row.coherent ? nowOf(each, row.of(each.prepared.used)).logLoss : undefined;
    },
  };
}

function reach(moving: Moving, prepared: PreparedCase, index: number, was: CaseScore): Reached | undefined {
  const item = movingItem(moving, prepared);
  if (!item) return undefined;
  const { scores, truth } = prepared;
  const others = Array.from(scores, (score, cause) => [score, cause] as const).filter(([, cause]) => cause !== moving.cause);
  others.sort((a, b) => b[0] - a[0] || a[1] - b[1]);
  const top = others[0]?.[0] ?? -Infinity;
  const parts = others.map(([score]) => Math.exp(score - top));
  return {
    index,
    prepared,
    beside: withoutMoving(moving, item, prepared),
    was,
    top,
    sum: parts.reduce((a, b) => a + b, 0),
    squares: parts.reduce((a, b) => a + b * b, 0),
    highest: others.slice(0, 3),
    ahead: others.findIndex(([, cause]) => cause === truth),
  };
}

/** The scores of a case once the moving cause has another score. */
function moved({ cause }: Moving, { prepared, top, sum, squares, highest, ahead }: Reached, score: number): CaseScore {
  const { truth, scores } = prepared;
  const above = Math.max(top, score);
  const [scale, own] = [Math.exp(top - above), Math.exp(score - above)];
  const total = scale * sum + own;
  const truthScore = truth === cause ? score : (scores[truth] ?? -Infinity);
  const logP = truthScore - above - Math.log(total);
  const over = (other: number, index: number) => score > other || (score === other && cause < index);
  const [first] = highest;
  return {
    logLoss: -logP,
    brier: (scale * scale * squares + own * own) / (total * total) - 2 * Math.exp(logP) + 1,
    ahead: truth === cause ? highest.filter(([other, index]) => !over(other, index)).length : ahead + (over(truthScore, truth) ? 1 : 0),
    leader: first === undefined || over(first[0], first[1]) ? cause : first[1],
  };
}

