import { selectCalls, selectCaseEvents } from '@/db/queries/case';
import { selectCatchesUnderWay } from '@/db/queries/oil-catch';
import { PERMITTED } from '@/lib/auth/permissions';
import { buildReasons } from '@/lib/case/build-reasons';
import { buildState } from '@/lib/case/build-state';
import { headView } from '@/lib/case/view/head';
import { momentsOf } from '@/lib/case/view/moments';
import { rulebookView } from '@/lib/case/view/rulebook';
import { usualViews } from '@/lib/case/view/usual';
import { readCaseInput } from '@/lib/schemas/case';
import type { CallView, CaseReasons, CaseState, CaseView, OtherHoldView, WatchingView } from '@/lib/schemas/case-view';
import { limitViews } from '@/lib/case/view/limits';
import { baselinesOfCase } from '../baseline/of-case';
import { defineRead } from '../define';
import { limitsOfCase } from '../limit/of-case';
import { watchingOf } from '../watch/of-case';
import { gatherState } from './gather-state';
import { holdsOfUnit } from './holds-of-unit';
import { standingCall } from './standing-call';

/** What changes of a case: its ranking, findings and next checks, now or as they were. */
export const readCaseState = defineRead({
  name: 'read.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: readCaseInput,
  run: async ({ tx, ctx, input }): Promise<CaseState> =>
    buildState(await gatherState(tx, ctx, { caseId: input.caseId, at: input.at ? new Date(input.at) : null })),
});

/** Why its causes stand where they stand, now or as they did. */
export const readCaseReasons = defineRead({
  name: 'read.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: readCaseInput,
  run: async ({ tx, ctx, input }): Promise<CaseReasons> =>
    buildReasons(await gatherState(tx, ctx, { caseId: input.caseId, at: input.at ? new Date(input.at) : null })),
});

/** Everything that the page of a case shows, now or as it was. */
export const readCase = defineRead({
  name: 'read.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: readCaseInput,
  run: async ({ tx, ctx, input }): Promise<CaseView> => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const at = input.at ? new Date(input.at) : null;
    const { caseHead, ...parts } = await gatherState(tx, ctx, { caseId: input.caseId, at });
    const rulebook = rulebookView(parts.compiled, ctx.person.units);
    const allEvents = await selectCaseEvents(tx, of);
    const events = allEvents.filter((event) => !at || event.at <= at);
    const calls = (await selectCalls(tx, of)).filter((call) => !at || call.at <= at);
    const state = buildState(parts);
    const everything = at ? buildState((await gatherState(tx, ctx, { caseId: input.caseId }))).findings : state.findings;
    return {
      reader: { personId: ctx.person.id, organisationId: ctx.organisation.id },
      head: headView(caseHead, ctx.person.units),
      rulebook,
      state: at ? { ...state, status: statusAt(events) } : state,
      reasons: buildReasons(parts),
      // Nobody answers in the past, and what was usual then stands with the answers of then.
      usual: at ? {} : usualViews(await baselinesOfCase(tx, { ...of, head: caseHead, compiled: parts.compiled, now: ctx.now() }), ctx.person.units),
      otherHolds: at ? [] : otherHolds(await holdsOfUnit(tx, { ...of, unitId: caseHead.unitId }), of.caseId),
      limits: at ? {} : limitViews(await limitsOfCase(tx, of), parts.compiled, ctx.person.units),
      catching: at ? [] : (await selectCatchesUnderWay(tx, of)).map(({ checkId, startedAt, remindAt }) => ({ checkId, since: startedAt.toISOString(), remindAt: remindAt?.toISOString() ?? null })),
      watching: at ? NOTHING_WATCHED : await watchingOf(tx, { ...of, head: caseHead, compiled: parts.compiled, now: ctx.now() }),
      assignedTo: caseHead.assignedTo,
      calls: callViews(calls, events),
      events: events.map(({ at: when, ...event }) => ({ ...event, at: when.toISOString() })),
      moments: momentsOf(rulebook, everything, allEvents),
    };
  },
});

const NOTHING_WATCHED: WatchingView = { own: null, others: [], cameBackFrom: null };

/** What this case itself holds stands in its state; of what it found there is still what has passed and waits. */
const otherHolds = (holds: OtherHoldView[], caseId: string): OtherHoldView[] =>
  holds.map((held) => (held.caseId === caseId ? { ...held, checks: [] } : held)).filter(({ checks, passed }) => checks.length + passed.length > 0);

type Events = Awaited<ReturnType<typeof selectCaseEvents>>;

function statusAt(events: Events): CaseState['status'] {
  const last = events.filter(({ kind }) => kind !== 'assigned' && kind !== 'doubted').at(-1)?.kind;
  return last === 'called' || last === 'closed' ? last : 'open';
}

function callViews(calls: Awaited<ReturnType<typeof selectCalls>>, events: Events): CallView[] {
  const standing = standingCall(calls, events);
  return calls.map(({ at, runId: _, ...call }) => ({ ...call, at: at.toISOString(), standing: call.id === standing?.id }));
}
