import { rank, type CompiledCheck, type Finding } from '@/lib/diagnose';
import { seededRandom, type Random } from '../support/random';
import { compiled } from './findings';

const allChecks: readonly CompiledCheck[] = [...compiled.checks.values()];

/** An index with the chances given, which sum to 1. */
function pickIndex(random: Random, chances: readonly number[]): number {
  let left = random.unit();
  const index = chances.findIndex((chance) => {
    left -= chance;
    return left < 0;
  });
  return index < 0 ? chances.length - 1 : index;
}

/** A case drawn from a cause's own tables: each check answered, by itself, with chance b_v e^{w_cv} for answer v. */
function drawn(random: Random, cause: number, checks: readonly CompiledCheck[]): Finding[] {
  return checks.map((check) => {
    const chances = check.backgrounds.map((background, state) => background * Math.exp(check.table[state]?.[cause] ?? 0));
    const state = check.stateIds[pickIndex(random, chances)] ?? '';
    return { id: check.id, checkId: check.id, stage: { kind: 'diagnosis' }, shares: [{ state, share: 1 }], reliability: 1 };
  });
}

export interface DrawResult {
  cause: string;
  /** Shares of the draws in which the cause came first, and among the first three. */
  first: number;
  firstThree: number;
}

/**
 * How often each cause is found again in cases drawn from it.
 *
 * @param draws cases for each cause
 * @param checksAnswered how many checks, chosen at random, are answered; all of them by default
 */
export function drawAndRank(draws: number, checksAnswered = allChecks.length): DrawResult[] {
  return compiled.causeIds.map((cause, index) => {
    const random = seededRandom(1000 * checksAnswered + index);
    let first = 0;
    let firstThree = 0;
    for (let draw = 0; draw < draws; draw += 1) {
      const checks = checksAnswered < allChecks.length ? random.shuffle(allChecks).slice(0, checksAnswered) : allChecks;
      const place = rank(compiled, drawn(random, index, checks)).causes.findIndex(({ causeId }) => causeId === cause);
      if (place === 0) first += 1;
      if (place < 3) firstThree += 1;
    }
    return { cause, first: first / draws, firstThree: firstThree / draws };
  });
}
