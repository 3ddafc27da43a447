/** Which check tells most for the time it takes, and when enough is known to repair. */
import type { CompiledRulebook } from './compiled';
import { pricer } from './evsi-repairs';
import { entropyBits, settles, type Forecast, type Settles } from './information';
import { openPairs, type OpenChecks } from './next-checks-open';
import { placeCandidates, type Candidate } from './next-checks-order';
import { repairOrder, type RepairOrder } from './repair-order';
import { labourCost, repairProblem, type RepairMoney, type RepairProblem } from './repair-order-costs';
import { AS_PARKED, minutesToGo, stateAfter, type VehicleState } from './set-up';
import type { Check } from './types';

/** Least time that a check is taken to cost: somebody has to read it and tap. */
export const LEAST_MINUTES = 0.25;

export interface Suggestion {
  /** One check, or two in the order in which to make them. */
  checkIds: readonly string[];
  /** The screen of yes/no checks that it belongs to; the panel's other checks are not offered beside it. */
  panelId?: string;
  /** I, expected information. */
  bits: number;
  word: Settles;
  /** From where the vehicle stands now, set-up included. */
  minutes: number;
  setUpMinutes: number;
  /** Chance that it can't be answered. */
  cannotTell: number;
  /** (1 - u) I / max(0.25, minutes): what it is ordered by. */
  bitsPerMinute: number;
  /** (1 - u) EVSI, money: how much cheaper the repair is expected to become. Left out where nothing hung on it. */
  saving?: number;
  /** Its minutes in money. */
  cost: number;
  why: { kind: 'chosen' } | { kind: 'waits-for'; checkIds: string[] };
  /** Open checks whose evidence it destroys, valuable or not. */
  spoils: readonly string[];
}

export interface NextChecks {
  /** Best first. Pairs only where both together beat each alone. */
  suggestions: Suggestion[];
  /** Left out, because a check that was made has destroyed their evidence. */
  spoiled: OpenChecks['spoiled'];
  /** What is left to know, bits. */
  entropyLeft: number;
  /** True: no check is worth its cost any more; repair. */
  enoughIsKnown: boolean;
  repair: RepairOrder;
}

export interface NextChecksOptions {
  /** Where the vehicle stands; by default as it is handed in. */
  vehicle?: VehicleState;
  /** The organisation's own rates and costs; the rulebook's where left out. */
  money?: Partial<RepairMoney>;
}

interface Priced extends Candidate {
  forecast: Forecast;
  minutes: number;
  setUpMinutes: number;
  cannotTell: number;
}

interface Judged extends Priced {
  word: Settles;
  cost: number;
  saving?: number;
}

/** The repair problem of a rulebook, with its causes in the ranking's order. */
export function repairProblemOf(compiled: CompiledRulebook, money: Partial<RepairMoney> = {}): RepairProblem {
  const byId = new Map(compiled.rulebook.causes.map((cause) => [cause.id, cause]));
  const causes = compiled.causeIds.map((id) => byId.get(id) ?? { id });
  return repairProblem(compiled.rulebook.remedies, causes, { ...compiled.settings, ...money });
}

/**
 * Orders the open checks by what they tell per minute, prices what each would save, and says when to stop.
 *
 * A check pays when its expected saving, times the chance that it can be answered, exceeds its minutes (a quarter at
 * least) at the labour rate. When none pays, enough is known. A check that spoils a valuable one waits for it;
 * valuable is what settles at least some of what is left.
 *
 * @param open from `openChecks`
 * @param options where the vehicle stands, and the organisation's money
 * @returns suggestions, what is spoiled, the verdict, and the best order of repairs as things stand
 * @see Heckerman, Breese and Rommelse (1995), Decision-theoretic troubleshooting, for saving against cost
 * @example nextChecks(openChecks(whatIf, findings)).suggestions[0]?.checkIds
 */
export function nextChecks(open: OpenChecks, { vehicle = AS_PARKED, money = {} }: NextChecksOptions = {}): NextChecks {
  const { compiled, posterior } = open.whatIf;
  const rate = money.labourRatePerHour ?? compiled.settings.labourRatePerHour;
  const alone = singles(open, vehicle);
  const candidates = [...alone, ...betterPairs(open, vehicle, alone)];
  const problem = repairProblemOf(compiled, money);
  const entropyLeft = entropyBits(posterior);
  const price = pricer(problem, posterior);

  const judged = candidates
    .map((candidate): Judged => ({
      ...candidate,
      word: settles(candidate.forecast.bits, entropyLeft),
      cost: labourCost(Math.max(LEAST_MINUTES, candidate.minutes), rate),
    }))
    .sort((x, y) => y.bitsPerMinute - x.bitsPerMinute);
  // Pricing searches a plan after every answer, so that only what something hangs on is priced.
  const pays = (candidate: Judged): boolean => {
    candidate.saving ??= (1 - candidate.cannotTell) * price(candidate.forecast);
    return candidate.saving > candidate.cost;
  };
  const enoughIsKnown = !judged.some(pays);
  const atRisk = new Set(judged.flatMap(({ spoils }) => spoils));
  const worthWaitingFor = judged
    .filter(({ checkIds, word }) => checkIds.length === 1 && word !== 'settles little' && checkIds.some((id) => atRisk.has(id)))
    .flatMap(({ checkIds }) => checkIds);
  const suggestions = placeCandidates(judged, new Set(worthWaitingFor)).map(({ candidate, waitsFor }): Suggestion => ({
    checkIds: candidate.checkIds,
    ...panelOf(compiled, candidate.checkIds),
    bits: candidate.forecast.bits,
    word: candidate.word,
    minutes: candidate.minutes,
    setUpMinutes: candidate.setUpMinutes,
    cannotTell: candidate.cannotTell,
    bitsPerMinute: candidate.bitsPerMinute,
    ...(candidate.saving === undefined ? {} : { saving: candidate.saving }),
    cost: candidate.cost,
    why: waitsFor.length > 0 ? { kind: 'waits-for', checkIds: waitsFor } : { kind: 'chosen' },
    spoils: candidate.spoils,
  }));
  return {
    suggestions: oncePerPanel(suggestions),
    spoiled: open.spoiled,
    entropyLeft,
    enoughIsKnown,
    repair: repairOrder(problem, posterior),
  };
}

function singles({ whatIf, checks }: OpenChecks, vehicle: VehicleState): Priced[] {
  const { setUpMinutes: table } = whatIf.compiled.settings;
  return [...checks.values()].map(({ check, forecast }) => {
    const setUpMinutes = minutesToGo(vehicle, check.setUp, table);
    return priced([check], forecast, setUpMinutes, checks);
  });
}

/** Pairs that tell more per minute together than each of their checks alone; the others would only repeat those. */
function betterPairs(open: OpenChecks, vehicle: VehicleState, alone: readonly Priced[]): Priced[] {
  const { whatIf, checks } = open;
  const { setUpMinutes: table } = whatIf.compiled.settings;
  const worth = new Map(alone.map(({ checkIds, bitsPerMinute }) => [checkIds[0], bitsPerMinute]));
  return openPairs(open).flatMap(({ checkIds: [a, b], forecast }) => {
    const [first, second] = [checks.get(a)?.check, checks.get(b)?.check];
    if (!first || !second) return [];
    const orders = [[first, second], [second, first]] as const;
    const [best] = orders
      .filter(([early, late]) => !early.spoils.includes(late.id))
      .map(([early, late]) => ({
        both: [early, late],
        setUp: minutesToGo(vehicle, early.setUp, table) + minutesToGo(stateAfter(vehicle, early.setUp), late.setUp, table),
      }))
      .sort((x, y) => x.setUp - y.setUp);
    if (!best) return [];
    const pair = priced(best.both, forecast, best.setUp, checks);
    return pair.bitsPerMinute > Math.max(worth.get(a) ?? 0, worth.get(b) ?? 0) ? [pair] : [];
  });
}

function priced(made: readonly Check[], forecast: Forecast, setUpMinutes: number, open: OpenChecks['checks']): Priced {
  const minutes = setUpMinutes + made.reduce((sum, check) => sum + check.minutes, 0);
  const cannotTell = 1 - made.reduce((answered, check) => answered * (1 - check.cannotTell), 1);
  return {
    checkIds: made.map(({ id }) => id),
    forecast,
    minutes,
    setUpMinutes,
    cannotTell,
    bitsPerMinute: ((1 - cannotTell) * forecast.bits) / Math.max(LEAST_MINUTES, minutes),
    spoils: [...new Set(made.flatMap(({ spoils }) => spoils))].filter((id) => open.has(id)),
  };
}

function panelOf(compiled: CompiledRulebook, checkIds: readonly string[]): Pick<Suggestion, 'panelId'> {
  const [only, second] = checkIds;
  if (only === undefined || second !== undefined) return {};
  const panel = compiled.rulebook.panels.find(({ checks }) => checks.includes(only));
  return panel ? { panelId: panel.id } : {};
}

/** A panel is offered through its best check: the first of its checks in the order. */
function oncePerPanel(suggestions: readonly Suggestion[]): Suggestion[] {
  const shown = new Set<string>();
  return suggestions.filter(({ panelId }) => panelId === undefined || (!shown.has(panelId) && shown.add(panelId)));
}
