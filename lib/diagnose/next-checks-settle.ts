/** What would settle it: the answers that would move the ranking most. */
import { posteriorOf } from './log-sum-exp';
import type { OpenChecks } from './next-checks-open';

/** An answer that nobody has given yet, and what the ranking would say after it. */
export interface TellingAnswer {
  checkId: string;
  state: string;
  /** P_v: how likely that answer is, as things stand. */
  chance: number;
  /** The cause that is watched: its probability after that answer, given surely, as the ranking would show it. */
  then: number;
  /** Who would lead. */
  leaderThen: string;
}

export interface CauseMoves {
  causeId: string;
  p: number;
  /** The answer that would lift it most; left out where none would. */
  up?: TellingAnswer;
  /** The answer that would sink it most; left out where none would. */
  down?: TellingAnswer;
}

export interface WhatWouldSettle {
  /** By cause, highest p first; the first is the leader. */
  causes: CauseMoves[];
  /** The answer that would move the leader most, either way; left out where nothing would move it. */
  mostTelling?: TellingAnswer;
}

/** Answers less likely than this are passed over: a wonder would settle anything. */
export const LEAST_CHANCE = 0.02;

/**
 * For each cause the open answers that would lift it and sink it most. `then` is what the ranking would show after
 * the answer (the re-scored posterior), which with attenuated groups is not quite the p^(v) that forecasts use.
 *
 * @param open from `openChecks`
 * @param leastChance answers less likely than this are passed over, [0, 1)
 * @returns moves by cause, and the most telling answer for the leader
 * @example whatWouldSettle(open).mostTelling?.checkId
 */
export function whatWouldSettle({ whatIf, checks }: OpenChecks, leastChance = LEAST_CHANCE): WhatWouldSettle {
  const { compiled, posterior, scores } = whatIf;
  const { causeIds } = compiled;
  const up: (TellingAnswer | undefined)[] = causeIds.map(() => undefined);
  const down: (TellingAnswer | undefined)[] = causeIds.map(() => undefined);
  for (const [checkId, { check, logWeights, forecast }] of checks) {
    check.states.forEach(({ id: state }, v) => {
      const chance = forecast.chances[v] ?? 0;
      const weights = logWeights[v];
      if (!weights || chance < leastChance) return;
      const after = posteriorOf(scores.map((score, c) => score + (weights[c] ?? 0)));
      const leader = after.reduce((best, p, c) => (p > (after[best] ?? 0) ? c : best), 0);
      const leaderThen = causeIds[leader] ?? '';
      after.forEach((then, c) => {
        const now = posterior[c] ?? 0;
        if (then > (up[c]?.then ?? now)) up[c] = { checkId, state, chance, then, leaderThen };
        if (then < (down[c]?.then ?? now)) down[c] = { checkId, state, chance, then, leaderThen };
      });
    });
  }
  const causes = causeIds
    .map((causeId, c): CauseMoves => ({ causeId, p: posterior[c] ?? 0, ...definedOnly(up[c], down[c]) }))
    .sort((a, b) => b.p - a.p || (a.causeId < b.causeId ? -1 : 1));
  const [leader] = causes;
  if (!leader) return { causes };
  const { up: lift, down: sink, p } = leader;
  const mostTelling = lift && (!sink || lift.then - p >= p - sink.then) ? lift : sink;
  return mostTelling ? { causes, mostTelling } : { causes };
}

function definedOnly(up?: TellingAnswer, down?: TellingAnswer): Pick<CauseMoves, 'up' | 'down'> {
  return { ...(up ? { up } : {}), ...(down ? { down } : {}) };
}
