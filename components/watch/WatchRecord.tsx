import Link from 'next/link';
import { timeText } from '@/components/case/words';
import { DataTable, type Column } from '@/components/ui/DataTable';
import { measureText } from '@/components/units/MeasureField';
import { dayText } from '@/lib/schemas/day-text';
import { BEGIN_WORDS, ODOMETER } from '@/lib/schemas/watch';
import type { WatchView } from '@/lib/services/watch/list';
import type { UnitPreferences } from '@/lib/units';

const PROOF: Readonly<Record<string, string>> = {
  none: 'The call is not proved by it.',
  seen: 'The cause was seen: one sure finding points strongly to it.',
  isolated: 'The cause is proved by the repair: one thing was changed, and it held.',
  'held-with-others': 'It held, with several things changed: the repairs are proved together, not the one cause.',
};
const OUTCOME: Readonly<Record<string, string>> = { held: 'It held', comeback: 'It came back', lost: 'Lost sight of' };

interface Props {
  watch: WatchView;
  units: UnitPreferences;
  timeZone: string;
}

/** One watch: since when and until when, what was read, what came of it. */
export function WatchRecord({ watch, units, timeZone }: Props) {
  const { id, cause, plan, startedAt, startedBy, ends, begin, readings, endedAt, endedBy, outcome, why, proof, comeback } = watch;
  const columns: Column<WatchView['readings'][number]>[] = [
    { key: 'at', header: 'When', rowHeader: true, cell: ({ at, takenBack }) => (takenBack ? <s>{timeText(at, timeZone)}</s> : timeText(at, timeZone)) },
    { key: 'check', header: 'What', cell: ({ check }) => check },
    { key: 'answer', header: 'Read', cell: ({ answer }) => answer },
    { key: 'verdict', header: 'Verdict', cell: ({ isInOrder }) => (isInOrder ? 'In order' : 'Not in order') },
    { key: 'odometer', header: 'Odometer', numeric: true, cell: ({ odometerM }) => measureText(odometerM, ODOMETER, units) },
    { key: 'by', header: 'By', cell: ({ by, byLink, note, takenBack }) => [byLink ? `${by}, by a link` : by, note && `“${note}”`, takenBack && `taken back by ${takenBack.by}: “${takenBack.why}”`].filter(Boolean).join('; ') },
  ];
  return (
    <section aria-labelledby={`watch-${id}`} className="grid gap-3">
      <h2 id={`watch-${id}`}>{endedAt && outcome ? OUTCOME[outcome] : plan}</h2>
      <p className="max-w-prose">
        {cause}. Watched since {timeText(startedAt, timeZone)}, by {startedBy}; until {dayText(ends.on)}{ends.atM !== null && <> and <span className="figure">{measureText(ends.atM, ODOMETER, units)}</span> on the odometer</>}.
        {endedAt && <> Ended {timeText(endedAt, timeZone)} by {endedBy}{why && `: ${why}`}.</>}
      </p>
      {proof && <p className="max-w-prose">{PROOF[proof]}</p>}
      {comeback && <p><Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/cases/${comeback.caseId}`}>Case {comeback.number} goes on with it</Link></p>}
      <ul className="ml-5 grid max-w-prose list-disc gap-1">{begin.map(({ statement, answer, why: because }) => <li key={statement}>{statement} {BEGIN_WORDS[answer]}{because && `: ${because}`}</li>)}</ul>
      {begin.some(({ answer }) => answer === 'no') && <p className="max-w-prose">Not all of this was so when it began: the watch proves less.</p>}
      {readings.length > 0 ? <DataTable caption="Readings" columns={columns} rows={readings} rowKey={(one) => one.id} /> : <p className="text-ink-soft">Nothing was read yet.</p>}
    </section>
  );
}
