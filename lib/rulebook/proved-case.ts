/** A case whose cause was proved: what a rulebook is tried on, and what it learns from. */
import type { Finding, RecordFacts } from '@/lib/diagnose/types';

/** How a cause was proved. Only the first two teach or score: in the third, something else may have mended it. */
export type ProofLevel = 'seen' | 'isolated' | 'held-with-others';

/** Why a check was asked: suggested by the ranking, asked in every case, at random, one of a panel, or somebody's choice. */
export const WHY_ASKED = ['suggested', 'always', 'random', 'panel', 'choice'] as const;
export type WhyAsked = (typeof WHY_ASKED)[number];

export interface ProvedCase {
  id: string;
  /** Id of the cause that was proved. */
  truth: string;
  /** Current findings of the diagnosis that were given before the cause was proved. */
  findings: readonly Finding[];
  /** What unit, model and fit knew. */
  facts?: RecordFacts;
  /** By check: why it was asked. */
  asked?: Readonly<Record<string, WhyAsked>>;
}

/** A case as it is stored, before anybody asks whether it may teach. */
export interface CalledCase {
  case: ProvedCase;
  proof: ProofLevel | 'none';
  /** When the cause was proved, ms; undefined while it is not. */
  provedAt?: number;
  /** By check: when it was answered, ms. */
  answeredAt: Readonly<Record<string, number>>;
}

/**
 * The cases that may teach: proved by sight or by one remedy alone. Answers given once the cause was proved are left
 * out: whoever has seen the worn ring answers every other check in its light.
 *
 * @param called cases of any proof
 * @returns proved cases with their earlier findings, in the order given
 * @example teachingCases(called).length <= called.length
 */
export function teachingCases(called: readonly CalledCase[]): ProvedCase[] {
  return called.flatMap(({ case: each, proof, provedAt, answeredAt }) => {
    if (proof !== 'seen' && proof !== 'isolated') return [];
    const before = (checkId: string) => provedAt === undefined || (answeredAt[checkId] ?? -Infinity) < provedAt;
    return [{ ...each, findings: each.findings.filter(({ checkId }) => before(checkId)) }];
  });
}

/**
 * Share of called cases whose cause was never proved well enough to teach. The higher it is, the less proved cases
 * stand for all: those that were easy to prove teach, the others are silent.
 *
 * @returns [0, 1]; undefined without cases
 * @example shareNeverProved([]) // undefined
 */
export function shareNeverProved(called: readonly Pick<CalledCase, 'proof'>[]): number | undefined {
  if (called.length === 0) return undefined;
  return called.filter(({ proof }) => proof !== 'seen' && proof !== 'isolated').length / called.length;
}
