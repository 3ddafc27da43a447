import type { Transaction } from '@/db/connect';
import { selectFittings } from '@/db/queries/fitting';
import { insertCall, insertCaseEvent, selectCalls, selectCaseEvents, selectCaseHead, updateCase } from '@/db/queries/case';
import { selectFindings } from '@/db/queries/finding';
import { selectRepairs } from '@/db/queries/repair';
import { selectLatestRun } from '@/db/queries/run';
import { selectMayHaveComeBack, selectWatchReadings, updateWatch, type WatchRow } from '@/db/queries/watch';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { findingsForRanking, rankOptions } from '@/lib/case/findings-for-ranking';
import { siteDay } from '@/lib/case/site-day';
import { rank, type CompiledRulebook } from '@/lib/diagnose';
import { conflict, invalid, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { endWatchInput } from '@/lib/schemas/watch';
import { isSeen, proofOf, whyNotHeld, type Outcome } from '@/lib/watch';
import { notify } from '../notice/notify';
import { lockCaseOf } from '../case/locked';
import { writeCase } from '../case/open';
import { standingCall } from '../case/standing-call';
import type { Ctx } from '../context';
import { defineWrite } from '../define';
import { lockWatchOf, refuseEnded } from './locked';
import { distanceTextFor, standingReads, watchedOf } from './standing';

interface Of {
  organisationId: string;
  caseId: string;
  watchId: string;
}

/**
 * Ends a watch, and the case with it: the repair held, the complaint came back, or nobody looked any more. The call is written
 * anew with what is proved by then; a comeback puts it in doubt and opens a case of its own. A person decides; nothing ends by itself.
 */
export const endWatch = defineWrite({
  name: 'end.watch',
  doing: 'end a watch',
  roles: PERMITTED['case.work'],
  input: endWatchInput,
  run: async (work) => {
    const { tx, ctx, input, audit, unchanged } = work;
    const { caseId, watchId, outcome, why } = input;
    const of = { organisationId: ctx.organisation.id, caseId, watchId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const watch = await lockWatchOf(tx, of);
    if (watch.outcome === outcome) {
      unchanged();
      return { id: watchId, caseId, comebackCaseId: watch.comebackCaseId };
    }
    refuseEnded(watch);
    if (outcome === 'held') await refuseTooEarly(tx, ctx, { of, compiled, watch, timeZone: head.timeZone, why });
    else if (!why) throw invalid({ why: outcome === 'lost' ? 'Say why nobody can look any more.' : 'Say what came back.' });
    const call = standingCall(await selectCalls(tx, of), await selectCaseEvents(tx, of));
    if (head.status !== 'called' || !call) throw conflict('This case is not called any more.');

    const at = ctx.now();
    const proof = proofOf({ outcome, seen: await wasSeen(tx, of, { compiled, causeId: call.mainCause }), remediesDone: await remediesDone(tx, of) });
    const { id: earlier, person: _, proof: __, at: ___, ...same } = call;
    const callId = newId(at.getTime());
    await insertCall(tx, { ...of, ...same, id: callId, proof, supersedes: earlier, personId: ctx.person.id, at });
    const note = (kind: string, reason: string | null) => insertCaseEvent(tx, { ...of, id: newId(at.getTime()), kind, reason, callId, personId: ctx.person.id, at });
    if (outcome === 'comeback') await note('doubted', why);
    await note('closed', [SAID[outcome], why].filter(Boolean).join(' '));
    await updateCase(tx, of, { status: 'closed', closedAt: at });
    const comebackCaseId = outcome === 'comeback' ? await (input.goesOnIn ? goOnIn(input.goesOnIn) : openComeback()) : null;
    if (outcome === 'comeback') await tellOfComeback(tx, ctx, { ...of, personIds: [head.assignedTo, watch.startedBy], why });
    await updateWatch(tx, of, { endedAt: at, endedBy: ctx.person.id, outcome, why, proof, comebackCaseId });
    audit({ entity: 'watch', entityId: watchId, changed: { caseId, outcome, reason: why, proof, comebackCaseId } });
    return { id: watchId, caseId, comebackCaseId };

    /** A case that was opened while it was watched. */
    async function goOnIn(goesOnIn: string): Promise<string> {
      const open = await selectMayHaveComeBack(tx, { organisationId: of.organisationId, unitId: head.unitId, since: watch.startedAt });
      if (!open.some((one) => one.caseId === goesOnIn)) throw invalid({ goesOnIn: 'Choose a case of this unit that is open.' });
      await updateCase(tx, { ...of, caseId: goesOnIn }, { comebackOf: caseId });
      return goesOnIn;
    }

    /** The same complaints on the same unit. */
    async function openComeback(): Promise<string> {
      const before = await selectCaseHead(tx, of);
      if (!before) throw notFound('case');
      const opened = { id: input.newCaseId ?? newId(at.getTime()), unit: { kind: 'known' as const, unitId: head.unitId }, complaints: before.complaints, complaintWords: why ?? '', odometerReplaced: false };
      return (await writeCase({ ...work, input: opened }, { comebackOf: caseId })).id;
    }
  },
});

const SAID: Readonly<Record<Outcome, string>> = { held: 'It held.', comeback: 'It came back.', lost: 'Nobody could look any more.' };

/** Who answers for a rulebook may say that it held without every reading, with why. */
async function refuseTooEarly(tx: Transaction, ctx: Ctx, { of, compiled, watch, timeZone, why }: { of: Of; compiled: CompiledRulebook; watch: WatchRow; timeZone: string; why: string | null }): Promise<void> {
  const missing = whyNotHeld(watchedOf(watch, timeZone), standingReads(await selectWatchReadings(tx, of), timeZone), { today: siteDay(ctx.now(), timeZone) }, {
    nameOf: (checkId) => compiled.checks.get(checkId)?.check.name ?? checkId,
    distanceText: distanceTextFor(ctx.person.units),
  });
  if (missing.length === 0) return;
  const mayAnyway = may(ctx.roles, 'watch.hold-early');
  if (mayAnyway && why) return;
  const message = `It can’t be said yet that it held. ${missing.join(' ')}`;
  throw conflict(message, { [mayAnyway ? 'why' : 'outcome']: mayAnyway ? 'Say why it held all the same.' : 'Read what is missing, or ask an engineer or a manager.' });
}

async function wasSeen(tx: Transaction, of: Of, { compiled, causeId }: { compiled: CompiledRulebook; causeId: string }): Promise<boolean> {
  const findings = findingsForRanking(await selectFindings(tx, of));
  const run = await selectLatestRun(tx, of);
  const { causes } = rank(compiled, findings, rankOptions(findings, run?.recordFacts ?? {}));
  // What somebody remembered shows nothing.
  const looked = findings.filter(({ checkId }) => compiled.checks.get(checkId)?.check.station !== 'vehicle-and-history');
  return isSeen(causes.find((cause) => cause.causeId === causeId)?.terms ?? [], looked);
}

/** What was changed: with a compressor so much is, as good practice asks, that it never counts as one thing alone. */
async function remediesDone(tx: Transaction, of: Of): Promise<number> {
  const repairs = (await selectRepairs(tx, of)).filter(({ outcome }) => outcome === 'done').length;
  return (await selectFittings(tx, of)).length > 0 ? Math.max(2, repairs) : repairs;
}

/** Tells whose case it is, and who began to watch it. */
async function tellOfComeback(tx: Transaction, ctx: Ctx, { organisationId, caseId, watchId, personIds, why }: Of & { personIds: (string | null)[]; why: string | null }): Promise<void> {
  for (const personId of new Set(personIds)) await notify(tx, ctx, { organisationId, personId, kind: 'comeback', caseId, key: `comeback ${watchId}`, about: { by: ctx.person.id, ...(why && { what: why }) } });
}
