import type { CaseView } from '@/lib/schemas/case-view';
import { dayText } from '@/lib/schemas/day-text';
import { GoingOn } from './GoingOn';
import { timeText } from './words';

const DUE = { waits: 'is to be read on', due: 'is due today,', overdue: 'is overdue since' } as const;

/** What a case has to do with repairs that are watched. Renders nothing where it has not. */
export function Watching({ view: { head, watching } }: { view: CaseView }) {
  const { own, others, cameBackFrom } = watching;
  return (
    <>
      {cameBackFrom && (
        <GoingOn href={`/cases/${cameBackFrom.caseId}`} link={`See case ${cameBackFrom.number}`}>
          <strong>This came back.</strong> The repair of case {cameBackFrom.number} didn’t hold; its call is in doubt.
        </GoingOn>
      )}
      {own && (
        <GoingOn href={`/cases/${head.id}/watch`} link={own.next && own.next.state !== 'waits' ? 'Read it' : 'See the watch'}>
          <strong>The repair is being watched</strong>{own.isOver ? <>; its time was over on {dayText(own.until)}: read what is missing, then say what came of it.</> : <> until {dayText(own.until)}.</>}{own.next && <> {own.next.check} {DUE[own.next.state]} {dayText(own.next.dueOn)}.</>}
        </GoingOn>
      )}
      {others.map(({ caseId, number, since }) => (
        <GoingOn key={caseId} href={`/cases/${caseId}/watch#end`} link={`It came back: end the watch of case ${number}`}>
          <strong>A repair of this unit is being watched</strong> since {timeText(since, head.timeZone)}, for case {number}. Is this the same trouble?
        </GoingOn>
      ))}
    </>
  );
}
