import Link from 'next/link';
import { timeText } from '@/components/case/words';
import { measureText } from '@/components/units/MeasureField';
import type { UnitPreferences } from '@/lib/units';
import { rateText, Weighings, type Rate, type WeighingView } from './Weighings';

export interface CatchView {
  id: string;
  checkId: string;
  check: string;
  startedAt: string;
  startedBy: string;
  engineS: number | null;
  place: string | null;
  remindEveryDays: number | null;
  remindAt: string | null;
  endedAt: string | null;
  endedBy: string | null;
  endedWhy: string | null;
  weighings: WeighingView[];
  perHour: Rate | null;
}

interface Props {
  caseId: string;
  oilCatch: CatchView;
  units: UnitPreferences;
  timeZone: string;
}

/** One catch: when it hung, what was weighed, and what all of it comes to. */
export function OilCatch({ caseId, oilCatch, units, timeZone }: Props) {
  const { id, check, startedAt, startedBy, engineS, place, endedAt, endedBy, endedWhy, weighings, perHour } = oilCatch;
  const standing = weighings.filter(({ takenBack }) => takenBack === null);
  const ranS = standing.reduce((sum, weighing) => sum + weighing.ranS, 0);
  return (
    <section aria-labelledby={`catch-${id}`} className="grid gap-3">
      <h2 id={`catch-${id}`}>{check}{endedAt ? ', done' : ''}</h2>
      <p className="max-w-prose">
        Since {timeText(startedAt, timeZone)}, by {startedBy}{place && `, ${place}`}.
        {engineS !== null && <> The hour meter stood at <span className="figure">{measureText(engineS, { quantity: 'engineHours' }, units)}</span>.</>}
        {endedAt && <> Taken down {timeText(endedAt, timeZone)} by {endedBy}{endedWhy && `: ${endedWhy}`}.</>}
      </p>
      {perHour ? (
        <p className="heading text-xl">
          <span className="figure">{rateText(perHour, units)}</span> <span className="font-normal">from {standing.length} {standing.length === 1 ? 'weighing' : 'weighings'} over <span className="figure">{measureText(ranS, { quantity: 'engineHours' }, units)}</span>.</span>
        </p>
      ) : (
        <p className="text-ink-soft">Not weighed yet.</p>
      )}
      {perHour && !endedAt && <p className="max-w-prose">It answers the check in <Link className="underline underline-offset-4" href={`/cases/${caseId}`}>the case</Link> from the first weighing on; each weighing counts with those before it.</p>}
      {weighings.length > 0 && <Weighings caption="Weighings" {...{ weighings, units, timeZone }} />}
    </section>
  );
}
