import { selectCalls, selectCaseEvents } from '@/db/queries/case';
import { insertWatch, lockWatch, type WatchRow } from '@/db/queries/watch';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { conflict, invalid, type FieldErrors } from '@/lib/errors';
import { startWatchInput } from '@/lib/schemas/watch';
import { planFor } from '@/lib/watch';
import { lockCaseOf } from '../case/locked';
import { standingCall } from '../case/standing-call';
import { defineWrite } from '../define';
import { noteReading } from '../unit/note-reading';
import { planWatchReminder } from './reminder';

/**
 * Begins to watch what was repaired, by the plan of the cause that was called. Each statement that makes a watch prove something
 * is answered; where one isn't true, why. The id is the client's: sent twice, it begins once.
 */
export const startWatch = defineWrite({
  name: 'start.watch',
  doing: 'watch repairs',
  roles: PERMITTED['case.work'],
  input: startWatchInput,
  run: async (work) => {
    const { tx, ctx, input: { id, caseId, begin, odometer }, audit, unchanged } = work;
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const known = await lockWatch(tx, { ...of, watchId: id });
    if (known && known.caseId !== caseId) throw conflict('This id belongs to another watch.');
    if (known) {
      unchanged();
      return { id, caseId };
    }
    const call = standingCall(await selectCalls(tx, of), await selectCaseEvents(tx, of));
    if (head.status !== 'called' || !call) throw conflict('Call the case first: a watch proves what was called.');
    const plan = planFor(compiled.rulebook.proof, call.mainCause);
    if (!plan) throw conflict('The rulebook of this case says nothing of watching.');
    const answers = answered(compiled.rulebook.proof?.watch.begin ?? [], begin);
    const { odometerM = null, asTyped = {} } = (await noteReading(work, { unitId: head.unitId, readOn: siteDay(ctx.now(), head.timeZone), odometer, source: 'case' })) ?? {};
    const written = await insertWatch(tx, { ...of, id, odometerM, unitId: head.unitId, causeId: call.mainCause, plan, begin: answers, asTyped, startedAt: ctx.now(), startedBy: ctx.person.id });
    if (!written) throw conflict('This case is being watched already.');
    await planWatchReminder(tx, ctx, { organisationId: of.organisationId, watchId: id, timeZone: head.timeZone });
    audit({ entity: 'watch', entityId: id, changed: { caseId, causeId: call.mainCause, plan: plan.id, begin: answers.map(({ answer }) => answer), odometerM } });
    return { id, caseId };
  },
});

/** The statements with what was said of each. */
function answered(statements: readonly string[], begin: readonly Pick<WatchRow['begin'][number], 'answer' | 'why'>[]): WatchRow['begin'] {
  const problems: FieldErrors = {};
  const answers = statements.flatMap((statement, i) => {
    const said = begin[i];
    if (!said) problems[`begin.${i}.answer`] = 'Answer this one.';
    else if (said.answer !== 'yes' && !said.why) problems[`begin.${i}.why`] = 'Say why, so that the proof can be judged later.';
    return said ? [{ statement, ...said }] : [];
  });
  if (begin.length > statements.length) problems.begin = 'There are fewer statements to answer.';
  if (Object.keys(problems).length > 0) throw invalid(problems);
  return answers;
}
