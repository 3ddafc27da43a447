import Link from 'next/link';
import { keepFigures } from '@/components/ui/figures';
import type { OtherHoldView } from '@/lib/schemas/case-view';

interface Props {
  unitId: string;
  /** Names of the checks of this case that hold. */
  checks: readonly string[];
  /** Names of those that held and have passed while the page was open. */
  passedHere: readonly string[];
  /** What else holds the unit. */
  others: readonly OtherHoldView[];
}

const listed = new Intl.ListFormat('en-GB');

/**
 * "Do not release", with the checks that say so. Danger to people, so it is red, and always in words. Renders nothing
 * when nothing holds.
 */
export function ReleaseHold({ unitId, checks, passedHere, others }: Props) {
  const passed = [...new Set([...others.flatMap((other) => other.passed), ...passedHere])].filter((name) => !checks.includes(name));
  if (checks.length + passed.length === 0 && others.every((other) => other.checks.length === 0)) return null;
  return (
    <section aria-labelledby="do-not-release" className="mb-6 border-2 border-danger bg-danger-ground px-4 py-3">
      <h2 id="do-not-release" className="text-danger">Do not release</h2>
      {checks.length > 0 && <p className="mt-1"><strong>{keepFigures(listed.format(checks))}</strong>: until {checks.length === 1 ? 'this check has' : 'these checks have'} passed.</p>}
      {others.filter((other) => other.checks.length > 0).map(({ caseId, number, checks: names }) => (
        <p key={caseId} className="mt-1">
          <strong>{keepFigures(listed.format(names))}</strong>, found in <Link className="inline-flex min-h-8 items-center underline underline-offset-4" href={`/cases/${caseId}`}>case {number}</Link>.
        </p>
      ))}
      {passed.length > 0 && (
        <p className="mt-1">
          <strong>{keepFigures(listed.format(passed))}</strong> passed since. Somebody with the right to release lifts the flag on <Link className="inline-flex min-h-8 items-center underline underline-offset-4" href={`/units/${unitId}`}>the unit’s page</Link>.
        </p>
      )}
      <p className="mt-1 text-[0.9375rem]">What your workshop does with this flag is its own rule.</p>
    </section>
  );
}
