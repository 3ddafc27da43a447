import Link from 'next/link';
import { keepFigures } from '@/components/ui/figures';
import type { OtherHoldView } from '@/lib/schemas/case-view';

interface Props {
  /** Names of the checks of this case that hold; empty on the page of a unit. */
  checks: readonly string[];
  /** Other cases of the unit that hold. */
  others: readonly OtherHoldView[];
  /** Whether the reader may open cases; else they are only named. */
  linksToCases?: boolean;
}

const listed = new Intl.ListFormat('en-GB');

/**
 * "Do not release", with the checks that say so. Danger to people, so it is red, and always in words. Renders nothing
 * when nothing holds.
 */
export function ReleaseHold({ checks, others, linksToCases = true }: Props) {
  if (checks.length === 0 && others.length === 0) return null;
  return (
    <section aria-labelledby="do-not-release" className="mb-6 border-2 border-danger bg-danger-ground px-4 py-3">
      <h2 id="do-not-release" className="text-danger">Do not release</h2>
      {checks.length > 0 && <p className="mt-1"><strong>{keepFigures(listed.format(checks))}</strong>: until {checks.length === 1 ? 'this check has' : 'these checks have'} passed.</p>}
      {others.map(({ caseId, number, checks: names }) => (
        <p key={caseId} className="mt-1">
          <strong>{keepFigures(listed.format(names))}</strong>, found in {linksToCases ? <Link className="inline-flex min-h-8 items-center underline underline-offset-4" href={`/cases/${caseId}`}>case {number}</Link> : `case ${number}`}.
        </p>
      ))}
      <p className="mt-1 text-[0.9375rem]">What your workshop does with this flag is its own rule.</p>
    </section>
  );
}
