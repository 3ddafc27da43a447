import { SOMETHING_ELSE, type Rulebook } from '@/lib/diagnose';
import type { ProvedCase } from '@/lib/rulebook/proved-case';
import { seededRandom } from './random';
import { randomFinding } from './random-rulebook';

/** Proved cases of a rulebook with random findings: three checks in four answered, any cause the truth. */
export function randomProvedCases(rulebook: Rulebook, count: number, seed: number, split = 0.5): ProvedCase[] {
  const random = seededRandom(seed);
  return Array.from({ length: count }, (_, index) => ({
    id: `case-${index}`,
    truth: random.pick(rulebook.causes).id,
    findings: rulebook.checks.flatMap((check) => (random.chance(0.75) ? [randomFinding(random, check, split)] : [])),
  }));
}

/** The rulebook with one weight changed. */
export function withWeight(rulebook: Rulebook, ruleName: string, causeId: string, decibans: number): Rulebook {
  return {
    ...rulebook,
    rules: rulebook.rules.map((rule) => (rule.name === ruleName ? { ...rule, weights: { ...rule.weights, [causeId]: decibans } } : rule)),
  };
}

export const listedCauses = (rulebook: Rulebook): string[] => rulebook.causes.map(({ id }) => id).filter((id) => id !== SOMETHING_ELSE);
