import { asTenant } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { selectCaseHead } from '@/db/queries/case';
import { lockCatch, selectWeighings } from '@/db/queries/oil-catch';
import { siteDay } from '@/lib/case/site-day';
import { jobs, type JobData } from '@/lib/jobs';
import { dayText } from '@/lib/schemas/day-text';
import { firstHere } from '../case/first-here';
import { postMail } from '../mail/post';
import type { Post } from '../mail/send';
import { planReminder } from './reminder';

/**
 * Mails that a bottle wants weighing, and plans the next mail. Nothing to do when somebody weighed, ended or planned
 * otherwise meanwhile, or the case was called. Mail and plan are written together, so that a worker that is killed does both
 * or neither.
 */
export async function remindOfWeighing({ db, now, baseUrl }: Pick<Post, 'db' | 'now' | 'baseUrl'>, { organisationId, catchId, due }: JobData['remind-weighing']): Promise<void> {
  await asTenant(db, { organisationId }, async (tx) => {
    const under = await lockCatch(tx, { organisationId, catchId });
    if (!under || under.endedAt || under.remindAt?.toISOString() !== due) return;
    const head = await selectCaseHead(tx, { organisationId, caseId: under.caseId });
    if (!head || head.status !== 'open') return;
    // Whoever has the case, else who hung the bottle.
    const member = await firstHere(tx, organisationId, [head.assignedTo, under.startedBy]);
    const at = now();
    if (member) {
      const last = (await selectWeighings(tx, { organisationId, catchIds: [catchId] })).filter(({ takenBackAt }) => takenBackAt === null).at(-1);
      const said = last ? `It was weighed last on ${dayText(siteDay(last.at, head.timeZone))}.` : `It has hung since ${dayText(siteDay(under.startedAt, head.timeZone))} and was not weighed yet.`;
      await postMail(tx, jobs, {
        organisationId,
        kind: 'weighing-due',
        entity: 'oil-catch',
        entityId: catchId,
        at,
        to: member.email,
        subject: `Weigh the oil caught: unit ${head.fleetNumber}, case ${head.number}`,
        text: `Hello ${member.name},

oil is being caught from unit ${head.fleetNumber} at ${head.siteName}${under.place ? `, ${under.place}` : ''}. ${said} Weigh it and read the hour meter here:

${new URL(`/cases/${under.caseId}/catch`, baseUrl).href}

Engine off, wheels chocked, eyes protected; the cautions stand on the page. Take the bottle down there to get no more of these.
`,
      });
    }
    await planReminder(tx, jobs, { organisationId, catchId, from: at, everyDays: under.remindEveryDays });
    await insertAudit(tx, [{ organisationId, action: 'mail.oil-catch', entity: 'oil-catch', entityId: catchId, changed: { caseId: under.caseId, mailed: member !== null }, at }]);
  });
}
