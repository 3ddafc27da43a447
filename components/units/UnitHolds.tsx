import Link from 'next/link';
import type { ActionState } from '@/lib/auth/form';
import { keepFigures } from '@/components/ui/figures';
import { dayText } from '@/lib/schemas/day-text';
import { LiftForm } from './LiftForm';

interface Hold {
  id: string;
  caseId: string;
  number: number;
  check: string;
  placedAt: Date;
  passedAt: Date | null;
}

interface Props {
  unitId: string;
  holds: readonly Hold[];
  /** Whether the reader may open cases; else they are only named. */
  linksToCases: boolean;
  /** null: the reader may not lift. */
  lift: ((previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>) | null;
}

const day = (at: Date) => dayText(at.toISOString().slice(0, 10));

function CaseName({ caseId, number, linksToCases }: { caseId: string; number: number; linksToCases: boolean }) {
  if (!linksToCases) return `case ${number}`;
  return <Link className="inline-flex min-h-8 items-center underline underline-offset-4" href={`/cases/${caseId}`}>case {number}</Link>;
}

/** "Do not release", check by check, each with what it takes to lift it. Renders nothing when nothing holds. */
export function UnitHolds({ unitId, holds, linksToCases, lift }: Props) {
  if (holds.length === 0) return null;
  return (
    <section aria-labelledby="do-not-release" className="mb-8 max-w-4xl border-2 border-danger bg-danger-ground px-4 py-3">
      <h2 id="do-not-release" className="text-danger">Do not release</h2>
      <ul>
        {holds.map(({ id, caseId, number, check, placedAt, passedAt }) => (
          <li key={id} className="mt-2">
            <p>
              <strong>{keepFigures(check)}</strong>, found in <CaseName {...{ caseId, number, linksToCases }} /> on {day(placedAt)}
              {passedAt ? `. It passed on ${day(passedAt)} and waits to be lifted.` : ': until this check has passed.'}
            </p>
            {lift && <LiftForm action={lift} unitId={unitId} holdId={id} check={check} />}
          </li>
        ))}
      </ul>
      {!lift && <p className="mt-2">It is lifted by somebody with the right to release, on a measurement.</p>}
      <p className="mt-2 text-[0.9375rem]">What your workshop does with this flag is its own rule.</p>
    </section>
  );
}

interface Lifted {
  id: string;
  number: number;
  caseId: string;
  check: string;
  liftedAt: string;
  by: string;
  found: string;
  basis: string | null;
  limitSource: string | null;
}

/** What stood against the unit's release and was lifted. */
export function LiftedHolds({ lifted, linksToCases }: { lifted: readonly Lifted[]; linksToCases: boolean }) {
  if (lifted.length === 0) return null;
  return (
    <section aria-labelledby="lifted" className="min-w-0">
      <h2 id="lifted" className="mb-2">“Do not release” lifted</h2>
      <ul className="border-t border-ink">
        {lifted.map(({ id, number, caseId, check, liftedAt, by, found, basis, limitSource }) => (
          <li key={id} className="border-b border-rule py-2">
            <p><strong>{check}</strong> (<CaseName {...{ caseId, number, linksToCases }} />): {found}</p>
            <p className="text-[0.9375rem] text-ink-soft">
              {by}, {dayText(liftedAt.slice(0, 10))}{basis && `; by right of: ${basis}`}{limitSource && `; limit: ${limitSource}`}
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}
