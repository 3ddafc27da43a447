import type { CompiledCheck } from '@/lib/diagnose/compiled';
import { rowOf } from '../row';

/** Answers of a check that share one weight for a cause, since one rule names them all; or all that no rule names. */
export interface Block {
  /** Undefined for the answers whose weight the compiler fills in. */
  rule?: string;
  /** Indices of the answers. */
  states: number[];
  /** Sum of their background rates. */
  background: number;
  /** theta0, their share with the cause as the rulebook has it; the blocks of a row sum to 1. */
  share: number;
  /** The weight as it is given, decibans. */
  decibans?: number;
}

/**
 * The answers of a check as one cause's row groups them. A sum of a Dirichlet distribution's shares is a share of a
 * coarser one, so that a weight which a rule gives to several answers is learned from all of them at once.
 *
 * @param check from `compiled.checks`
 * @param causeId whose row
 * @returns one block for each rule that weighs the cause, then the rest, if any; none when no rule weighs it
 * @example blocksOf(check, 'rings-worn')[0]?.share
 */
export function blocksOf(check: CompiledCheck, causeId: string): Block[] {
  const row = rowOf(check, causeId);
  if (!row.coherent) return [];
  const blocks = new Map<string | undefined, Block>();
  check.rulesByState.forEach((rules, state) => {
    const rule = rules.find((each) => Object.hasOwn(each.rule.weights, causeId));
    const background = check.backgrounds[state] ?? 0;
    const share = background * Math.exp(row.nats[state] ?? 0);
    const known = blocks.get(rule?.name);
    if (known) {
      known.states.push(state);
      known.background += background;
      known.share += share;
    } else {
      const decibans = rule?.rule.weights[causeId];
      blocks.set(rule?.name, { states: [state], background, share, ...(rule && { rule: rule.name }), ...(decibans !== undefined && { decibans }) });
    }
  });
  const all = [...blocks.values()];
  return all.some(({ rule }) => rule !== undefined) ? [...all.filter(({ rule }) => rule !== undefined), ...all.filter(({ rule }) => rule === undefined)] : [];
}
