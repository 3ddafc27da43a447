import { selectReadings } from '@/db/queries/unit-reading';
import { insertWatchReading, selectWatchReadings, updateWatchReading, type WatchReadingRow } from '@/db/queries/watch';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { notFound } from '@/lib/errors';
import { addWatchReadingInput, takeBackWatchReadingInput } from '@/lib/schemas/watch';
import { lockCaseOf, type LockedCase } from '../case/locked';
import { refuseUnread } from '../case/write-finding';
import { defineWrite, type Work } from '../define';
import { noteReading } from '../unit/note-reading';
import { strikeOut } from '../unit/strike-reading';
import { lockWatchOf, refuseEnded } from './locked';
import { readReading, takenReading } from './read-reading';
import { planWatchReminder } from './reminder';

/** Writes down what was read of a repair that is watched. The id is the client's: sent twice, it is read once. */
export const addWatchReading = defineWrite({
  name: 'add.watch-reading',
  doing: 'read what is watched',
  roles: PERMITTED['case.work'],
  input: addWatchReadingInput,
  run: async (work) => {
    const { tx, ctx, input: { id, caseId, watchId, ...typed }, audit, unchanged } = work;
    const of = { organisationId: ctx.organisation.id, caseId, watchId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const watch = await lockWatchOf(tx, of);
    if ((await selectWatchReadings(tx, of)).some(({ row }) => row.id === id)) {
      unchanged();
      return { id, caseId };
    }
    refuseEnded(watch);
    const read = await readReading(tx, { habits: ctx, compiled, watch, typed });
    const check = compiled.checks.get(typed.checkId)?.check;
    if (check) await refuseUnread(tx, ctx, { head, compiled, check });
    await noteReading(work, { unitId: head.unitId, readOn: siteDay(ctx.now(), head.timeZone), odometer: typed.odometer, source: 'case' });
    if (!(await insertWatchReading(tx, { ...of, ...read, id, personId: ctx.person.id, at: ctx.now() }))) throw takenReading();
    await planWatchReminder(tx, ctx, { organisationId: of.organisationId, watchId, timeZone: head.timeZone });
    audit({ entity: 'watch', entityId: watchId, changed: { caseId, checkId: read.checkId, shares: read.shares, valueTyped: read.valueTyped, verdict: read.verdict } });
    return { id, caseId };
  },
});

/** Takes a reading back that was wrong: it stays to be seen, and counts no more. */
export const takeBackWatchReading = defineWrite({
  name: 'take-back.watch-reading',
  doing: 'read what is watched',
  roles: PERMITTED['case.work'],
  input: takeBackWatchReadingInput,
  run: async (work) => {
    const { tx, ctx, input: { caseId, watchId, readingId, whyTakenBack }, audit, unchanged } = work;
    const of = { organisationId: ctx.organisation.id, caseId, watchId };
    const { head } = await lockCaseOf(tx, of);
    const watch = await lockWatchOf(tx, of);
    const reading = (await selectWatchReadings(tx, of)).find(({ row }) => row.id === readingId)?.row;
    if (!reading) throw notFound('reading');
    if (reading.takenBackAt) unchanged();
    else {
      refuseEnded(watch);
      await updateWatchReading(tx, { ...of, readingId }, { takenBackAt: ctx.now(), takenBackBy: ctx.person.id, takenBackWhy: whyTakenBack });
      await strikeOdometer(work, reading, head);
      await planWatchReminder(tx, ctx, { organisationId: of.organisationId, watchId, timeZone: head.timeZone });
      audit({ entity: 'watch', entityId: watchId, changed: { caseId, checkId: reading.checkId, takenBack: true, reason: whyTakenBack } });
    }
    return { id: readingId, caseId };
  },
});

/** What a reading wrote to its unit's record is struck out with it; what came by a link wrote nothing there. */
async function strikeOdometer(work: Work<unknown>, { odometerM, at, linkId }: WatchReadingRow['row'], { unitId, timeZone }: Pick<LockedCase, 'unitId' | 'timeZone'>): Promise<void> {
  if (odometerM === null || linkId !== null) return;
  const readOn = siteDay(at, timeZone);
  const readings = await selectReadings(work.tx, { organisationId: work.ctx.organisation.id, unitId });
  const written = readings.findLast((row) => row.source === 'case' && row.readOn === readOn && row.odometerM === odometerM && row.engineS === null);
  if (written) await strikeOut(work, { readingId: written.id, reason: 'Taken back with what was read of a watch' });
}
