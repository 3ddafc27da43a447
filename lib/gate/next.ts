/** Which check the gate asks next: the ranking's own order, held to what somebody at a counter can do in seven minutes. */
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { dangersOf } from '@/lib/diagnose/cautions';
import { LEAST_MINUTES, nextChecks } from '@/lib/diagnose/next-checks';
import { openChecks } from '@/lib/diagnose/next-checks-open';
import type { RankOptions } from '@/lib/diagnose/rank';
import { minutesToGo, AS_PARKED } from '@/lib/diagnose/set-up';
import type { Check, Finding } from '@/lib/diagnose/types';
import { createWhatIf } from '@/lib/diagnose/what-if';

/** Checks and minutes of one passage. Judgement: what a parts counter bears before an order. */
export const MOST_CHECKS = 5;
export const MOST_MINUTES = 7;

/** What a passage has used up. */
export interface Spent {
  checks: number;
  /** Of the checks asked, by the rulebook, however long they took. */
  minutes: number;
}

/** Minutes of a check on a vehicle as it is parked, its set-up included. */
export const minutesAtGate = ({ rulebook }: Pick<CompiledRulebook, 'rulebook'>, check: Pick<Check, 'minutes' | 'setUp'>): number =>
  minutesToGo(AS_PARKED, check.setUp, rulebook.settings.setUpMinutes) + check.minutes;

/**
 * Whether somebody at the counter may be asked for a check: nothing runs, no brake is released, nothing is opened, drained,
 * filled, heated or waited for.
 *
 * @example isForTheGate({ setUp: { engine: 'governed' } }) // false
 */
export function isForTheGate({ setUp }: Pick<Check, 'setUp'>): boolean {
  const asItStands = setUp.air === undefined && setUp.heat === undefined && (setUp.access ?? []).length === 0;
  return asItStands && dangersOf(setUp).length === 0;
}

export interface AtGate {
  /** Current findings of the unit's case, answers of the passage among them. */
  findings: readonly Finding[];
  /** What they are ranked with. */
  options: RankOptions;
  spent: Spent;
  /** Not to be asked: what was on the first screen already. */
  leaveOut: readonly string[];
  /** The organisation's own; the rulebook's where null. */
  labourRatePerHour: number | null;
}

/**
 * The check that tells most for what is left of the passage; null: enough is known, or nothing fits any more.
 *
 * Order and end are those of `nextChecks`. A passage is bounded twice, by minutes and by checks, so that a check costs at
 * least its share of the minutes left: five hasty questions would otherwise use up the checks and leave the minutes. What
 * would spoil a check worth waiting for isn't asked.
 *
 * @example nextAtGate(compiled, { findings, options: {}, spent: { checks: 0, minutes: 0 }, leaveOut: [], labourRatePerHour: null })
 */
export function nextAtGate(compiled: CompiledRulebook, { findings, options, spent, leaveOut, labourRatePerHour }: AtGate): { checkId: string; minutes: number } | null {
  const left = { checks: MOST_CHECKS - spent.checks, minutes: MOST_MINUTES - spent.minutes };
  if (left.checks <= 0 || left.minutes <= 0) return null;
  const open = openChecks(createWhatIf(compiled, findings, options), findings, options.stages);
  const { suggestions, enoughIsKnown } = nextChecks(open, { money: labourRatePerHour === null ? {} : { labourRatePerHour } });
  if (enoughIsKnown) return null;
  const share = left.minutes / left.checks;
  const [best] = suggestions
    .flatMap(({ checkIds: [checkId, another], why, bits, cannotTell, minutes }) => {
      const isAlone = checkId !== undefined && another === undefined && why.kind === 'chosen' && !leaveOut.includes(checkId);
      const check = isAlone ? compiled.checks.get(checkId)?.check : undefined;
      if (!check || !isForTheGate(check) || minutes > left.minutes) return [];
      return [{ checkId: check.id, minutes, worth: ((1 - cannotTell) * bits) / Math.max(LEAST_MINUTES, share, minutes) }];
    })
    .sort((a, b) => b.worth - a.worth || (a.checkId < b.checkId ? -1 : 1));
  return best && best.worth > 0 ? { checkId: best.checkId, minutes: best.minutes } : null;
}
