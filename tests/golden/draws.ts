import { rank, type CompiledCheck, type Finding } from '@/lib/diagnose';
import { pickIndex, sample, seededRandom } from '../support/prng';
import { compiled } from './findings';

const allChecks: readonly CompiledCheck[] = [...compiled.checks.values()];

/** A case drawn from a cause's own tables: each check answered, by itself, with chance b_v e^{w_cv} for answer v. */
function drawn(random: () => number, cause: number, checks: readonly CompiledCheck[]): Finding[] {
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
      const checks = checksAnswered < allChecks.length ? sample(random, allChecks, checksAnswered) : allChecks;
      const place = rank(compiled, drawn(random, index, checks)).causes.findIndex(({ causeId }) => causeId === cause);
      if (place === 0) first += 1;
      if (place < 3) firstThree += 1;
    }
    return { cause, first: first / draws, firstThree: firstThree / draws };
  });
}
