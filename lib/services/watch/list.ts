import { selectCalls, selectCaseEvents, selectCaseHead } from '@/db/queries/case';
import { selectMayHaveComeBack, selectWatches, selectWatchLinks, selectWatchReadings } from '@/db/queries/watch';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { answerText } from '@/lib/case/view/answer-text';
import { siteDay } from '@/lib/case/site-day';
import { notFound } from '@/lib/errors';
import { watchInput } from '@/lib/schemas/watch';
import { dueReadings, endOf, planFor, whyNotHeld } from '@/lib/watch';
import { standingCall } from '../case/standing-call';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';
import { linkPath } from './link-token';
import { distanceTextFor, standingReads, watchedOf } from './standing';

/** How a case's repair is or was watched, and by what it would be. Distances are m. */
export const listWatches = defineRead({
  name: 'list.watch',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: watchInput,
  run: async ({ tx, ctx, input: { caseId } }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const head = await selectCaseHead(tx, of);
    if (!head) throw notFound('case');
    const { rulebook, checks } = await compiledEdition(tx, { ...of, editionId: head.editionId });
    const nameOf = (checkId: string) => checks.get(checkId)?.check.name ?? checkId;
    const causeName = (causeId: string) => rulebook.causes.find(({ id }) => id === causeId)?.name ?? causeId;
    const distanceText = distanceTextFor(ctx.person.units);
    const today = siteDay(ctx.now(), head.timeZone);
    const call = standingCall(await selectCalls(tx, of), await selectCaseEvents(tx, of));
    const plan = call && planFor(rulebook.proof, call.mainCause);
    const watches = [];
    for (const { row, startedBy, endedBy, comebackNumber } of await selectWatches(tx, of)) {
      const readings = await selectWatchReadings(tx, { ...of, watchId: row.id });
      const links = await selectWatchLinks(tx, { ...of, watchId: row.id });
      const [watched, reads] = [watchedOf(row, head.timeZone), standingReads(readings, head.timeZone)];
      const mayRead = may(ctx.roles, 'case.work') && row.endedAt === null;
      watches.push({
        id: row.id,
        cause: causeName(row.causeId),
        plan: row.plan.name,
        begin: row.begin,
        startedAt: row.startedAt.toISOString(),
        startedBy,
        odometerM: row.odometerM,
        ends: endOf(watched),
        readings: readings.map(({ row: one, by, takenBackBy }) => ({
          id: one.id,
          checkId: one.checkId,
          check: nameOf(one.checkId),
          answer: answerText(checks.get(one.checkId)?.check, { ...one, errorSi: null }, ctx.person.units),
          isInOrder: one.verdict === 'in-order',
          note: one.note,
          odometerM: one.odometerM,
          by: by ?? one.byName ?? '',
          byLink: one.linkId !== null,
          at: one.at.toISOString(),
          takenBack: one.takenBackAt && { at: one.takenBackAt.toISOString(), by: takenBackBy ?? '', why: one.takenBackWhy ?? '' },
        })),
        due: row.endedAt ? [] : dueReadings(watched, reads, { today }).map(({ last: _, ...due }) => ({ ...due, check: nameOf(due.checkId) })),
        notHeldYet: row.endedAt ? [] : whyNotHeld(watched, reads, { today }, { nameOf, distanceText }),
        /** Open cases that may be its comeback. */
        mayGoOnIn: row.endedAt ? [] : (await selectMayHaveComeBack(tx, { ...of, unitId: row.unitId, since: row.startedAt })).map((one) => ({ caseId: one.caseId, number: one.number, openedOn: siteDay(one.openedAt, head.timeZone) })),
        links: links.map(({ row: link, createdBy }) => ({
          id: link.id,
          check: nameOf(link.checkId),
          forWhom: link.forWhom,
          createdBy,
          expiresAt: link.expiresAt.toISOString(),
          state: link.usedAt ? ('used' as const) : link.revokedAt ? ('revoked' as const) : link.expiresAt <= ctx.now() ? ('expired' as const) : ('open' as const),
          /** Where it leads; null: it works no more, or the reader gives none out. */
          path: mayRead && !link.usedAt && !link.revokedAt && link.expiresAt > ctx.now() ? linkPath(ctx.signingSecret, link) : null,
        })),
        endedAt: row.endedAt?.toISOString() ?? null,
        endedBy,
        outcome: row.outcome,
        why: row.why,
        proof: row.proof,
        comeback: row.comebackCaseId && comebackNumber !== null ? { caseId: row.comebackCaseId, number: comebackNumber } : null,
      });
    }
    return {
      caseId,
      /** What a watch would be begun with; null: nothing is called, or the rulebook says nothing of watching. */
      planned: call && plan ? { cause: causeName(call.mainCause), name: plan.name, begin: rulebook.proof?.watch.begin ?? [], days: Math.round(plan.duration / 86_400), distanceM: plan.distance ?? null, readings: plan.readings.map(({ check, every, everyDistance }) => ({ checkId: check, check: nameOf(check), everyDays: Math.round(every / 86_400), everyDistanceM: everyDistance ?? null })) } : null,
      watches,
    };
  },
});
export type CaseWatches = Awaited<ReturnType<typeof listWatches>>;
export type WatchView = CaseWatches['watches'][number];
