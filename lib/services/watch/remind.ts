import { asTenant } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { lockCase, selectCaseHead } from '@/db/queries/case';
import { findWatch, lockWatch } from '@/db/queries/watch';
import { siteDay } from '@/lib/case/site-day';
import { jobs, type JobData } from '@/lib/jobs';
import { firstHere } from '../case/first-here';
import { compiledEdition } from '../edition/compiled';
import type { Post } from '../mail/send';
import { notify } from '../notice/notify';
import { planWatchReminder } from './reminder';
import { dueOfWatch } from './standing';

/**
 * Tells whoever has the case, else who began the watch, what is due to be read, and plans the next time. Nothing to do when the
 * watch has ended or was planned otherwise meanwhile. Notice and plan are written together, so that a worker that is killed
 * does both or neither.
 */
export async function remindOfWatch({ db, now }: Pick<Post, 'db' | 'now'>, { organisationId, watchId, due }: JobData['remind-watch']): Promise<void> {
  await asTenant(db, { organisationId }, async (tx) => {
    const known = await findWatch(tx, { organisationId, watchId });
    // As whoever writes to the case does, the case before its watch: a notice of a case waits for it.
    if (known) await lockCase(tx, { organisationId, caseId: known.caseId });
    const watch = await lockWatch(tx, { organisationId, watchId });
    if (!watch || watch.endedAt || watch.remindAt?.toISOString() !== due) return;
    const { caseId } = watch;
    const head = await selectCaseHead(tx, { organisationId, caseId });
    if (!head) return;
    const at = now();
    const today = siteDay(at, head.timeZone);
    const open = (await dueOfWatch(tx, watch, { timeZone: head.timeZone, today })).filter(({ state }) => state !== 'waits');
    if (open.length > 0) {
      const { checks } = await compiledEdition(tx, { organisationId, editionId: head.editionId });
      const what = open.map(({ checkId }) => checks.get(checkId)?.check.name ?? checkId).join(', ');
      const member = await firstHere(tx, organisationId, [head.assignedTo, watch.startedBy]);
      if (member) await notify(tx, { jobs, now }, { organisationId, personId: member.personId, kind: 'watch-due', caseId, key: `watch-due ${watchId} ${today}`, about: { what } });
      await insertAudit(tx, [{ organisationId, action: 'remind.watch', entity: 'watch', entityId: watchId, changed: { caseId, checks: open.map(({ checkId }) => checkId), told: member !== null }, at }]);
    }
    await planWatchReminder(tx, { jobs, now }, { organisationId, watchId, timeZone: head.timeZone, isTold: true });
  });
}
