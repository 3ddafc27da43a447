import Link from 'next/link';
import type { CaseView } from '@/lib/schemas/case-view';
import { timeText } from './words';

/** A bottle that hangs from the unit: a finding that stays open for days. Renders nothing where none does. */
export function Catching({ view: { head, catching, rulebook } }: { view: CaseView }) {
  return catching.map(({ checkId, since, remindAt }) => (
    <p key={checkId} className="mb-4 border-l-4 border-ink pl-3">
      <strong>Oil is being caught</strong> for “{rulebook.checks[checkId]?.name ?? checkId}” since {timeText(since, head.timeZone)}{remindAt && `; the next reminder goes out on ${timeText(remindAt, head.timeZone)}`}.{' '}
      <Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/cases/${head.id}/catch`}>Weigh it</Link>
    </p>
  ));
}
