import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { repairProblemOf } from '@/lib/diagnose/next-checks';
import { repairOrder, type RepairOrder, type RepairStep } from '@/lib/diagnose/repair-order';
import type { Remedy, SetUp } from '@/lib/diagnose/types';
import { percent } from '@/lib/schemas/percent';
import type { PlannedRemedyView, RepairPlanView } from '@/lib/schemas/repair';
import { unreadOf } from './work-cautions';

/** How a vehicle stands while it is repaired: what was closed is open. */
export const REPAIR_SET_UP: SetUp = { engine: 'off', access: ['line-open'] };

/** A repair as its cautions see it. */
export const repairWork = ({ cautions }: Pick<Remedy, 'cautions'>) => ({ cautions, setUp: REPAIR_SET_UP });

interface Parts {
  caseId: string;
  compiled: CompiledRulebook;
  /** As the ranking has them now. */
  causes: readonly { causeId: string; p: number }[];
  currency: string;
  labourRatePerHour: number | null;
  /** Causes that the standing call named. */
  called: readonly string[];
  acknowledged: readonly { cautionId: string; dangers: readonly string[] }[];
}

/** The order of least expected cost as a case stands: at the organisation's labour rate, or the rulebook's until it has one. */
export function orderNow({ compiled, causes, labourRatePerHour }: Pick<Parts, 'compiled' | 'causes' | 'labourRatePerHour'>): RepairOrder {
  const p = new Map(causes.map((cause) => [cause.causeId, cause.p]));
  const problem = repairProblemOf(compiled, labourRatePerHour === null ? {} : { labourRatePerHour });
  return repairOrder(problem, compiled.causeIds.map((id) => p.get(id) ?? 0));
}

/** The remedies of least expected cost, in their order, each with why it stands there and what it takes. */
export function repairPlanView({ caseId, compiled, causes, currency, labourRatePerHour, called, acknowledged }: Parts): RepairPlanView {
  const { rulebook } = compiled;
  const order = orderNow({ compiled, causes, labourRatePerHour });
  const remedies = new Map(rulebook.remedies.map((remedy) => [remedy.id, remedy]));
  const names = new Map(rulebook.causes.map(({ id, name }) => [id, name]));
  return {
    caseId,
    currency,
    labourRatePerHour: labourRatePerHour ?? compiled.settings.labourRatePerHour,
    rateFrom: labourRatePerHour === null ? 'rulebook' : 'organisation',
    remedies: order.steps.flatMap((step, i) => {
      const remedy = remedies.get(step.remedyId);
      return remedy ? [plannedRemedy(remedy, step, { isFirst: i === 0, compiled, called, acknowledged })] : [];
    }),
    left: order.left.map(({ causeId, p: share }) => ({ causeId, name: names.get(causeId) ?? causeId, p: share })),
    expectedCost: order.expectedCost,
    costOfLeaving: order.costOfLeaving,
    exact: order.method !== 'greedy',
  };
}

interface Around extends Pick<Parts, 'compiled' | 'called' | 'acknowledged'> {
  isFirst: boolean;
}

function plannedRemedy(remedy: Remedy, step: RepairStep, { isFirst, compiled, called, acknowledged }: Around): PlannedRemedyView {
  const pWhenReached = step.p / step.reached;
  return {
    remedyId: remedy.id,
    name: remedy.name,
    station: remedy.station,
    causeIds: step.causeIds,
    p: step.p,
    pWhenReached,
    lookMinutes: remedy.look.minutes,
    fixMinutes: remedy.fix.minutes,
    lookCost: step.lookCost,
    fixCost: step.fixCost,
    comebackCost: step.comebackCost,
    parts: remedy.parts,
    why: whySentence(remedy, pWhenReached, isFirst),
    called: remedy.causes.some((id) => called.includes(id)),
    ...unreadOf(compiled, repairWork(remedy), acknowledged),
    steps: remedy.steps,
    basis: remedy.basis,
    source: remedy.source ?? null,
  };
}

/** "Do this first: 62% likely, 25 min to look." */
function whySentence(remedy: Remedy, chance: number, isFirst: boolean): string {
  const begins = isFirst ? 'Do this first' : 'If none before it was the one';
  const then = isFirst ? '' : ' then';
  const blind = remedy.seenInBay ? '' : ' Whether it was the one shows only in the weeks after.';
  return `${begins}: ${percent(chance)} likely${then}, ${remedy.look.minutes} min to look.${blind}`;
}
