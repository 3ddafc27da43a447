import type { CaseView } from '@/lib/schemas/case-view';
import { GoingOn } from './GoingOn';
import { timeText } from './words';

/** A bottle that hangs from the unit: a finding that stays open for days. Renders nothing where none does. */
export function Catching({ view: { head, catching, rulebook } }: { view: CaseView }) {
  return catching.map(({ checkId, since, remindAt }) => (
    <GoingOn key={checkId} href={`/cases/${head.id}/catch`} link="Weigh it">
      <strong>Oil is being caught</strong> for “{rulebook.checks[checkId]?.name ?? checkId}” since {timeText(since, head.timeZone)}{remindAt && `; the next reminder goes out on ${timeText(remindAt, head.timeZone)}`}.
    </GoingOn>
  ));
}
