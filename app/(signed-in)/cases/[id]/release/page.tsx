import type { Metadata } from 'next';
import Link from 'next/link';
import { CaseNav } from '@/components/case/CaseNav';
import { CheckAtStage } from '@/components/case/CheckAtStage';
import { timeText } from '@/components/case/words';
import { ReleaseForm } from '@/components/release/ReleaseForm';
import { RequiredCheck } from '@/components/release/RequiredCheck';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import type { CheckView } from '@/lib/schemas/case-view';
import type { ReleaseView } from '@/lib/schemas/release';
import { readCase } from '@/lib/services/case/read';
import { readRelease } from '@/lib/services/release/read';
import { measure, readCautions, release } from './actions';

export const metadata: Metadata = { title: 'Release' };

/** What is measured after a repair before the unit goes back on the road, and who releases it. */
export default async function ReleasePage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const view = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const { head, state, rulebook, limits } = view;
  const caseId = head.id;
  const asked = await readRelease({ ctx, input: { caseId } });
  const works = may(ctx.roles, 'case.work') && state.status !== 'closed';
  const checks = asked.checks.map(({ checkId }) => rulebook.checks[checkId]);
  const measuring = (check: CheckView | undefined, i: number, last: string | undefined) =>
    check && <CheckAtStage key={last} {...{ view, check }} above={checks.slice(0, i).filter((one) => one !== undefined)} stage={{ kind: 'release' }} newId={newId()} actions={{ readCautions, answer: measure }} />;
  return (
    <>
      <PageHeader
        title="Release"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${caseId}` }]}
        lead="What has to be measured after the repair, with the limits your organisation adopted. What was measured before the last work on the vehicle counts no more."
      />
      <CaseNav caseId={caseId} here="/release" />
      <div className="grid max-w-4xl gap-8">
        <section aria-labelledby="required" className="grid gap-6">
          <h2 id="required">To be in order</h2>
          {asked.checks.length === 0 && <Notice title="This edition doesn’t say what to measure before a release">Go by the maker’s information and local rules.</Notice>}
          {asked.checks.map((required, i) => (
            <RequiredCheck
              key={required.checkId}
              required={required}
              limit={limits[required.checkId] ?? null}
              timeZone={head.timeZone}
              form={works ? measuring(checks[i], i, required.measured?.findingId) : null}
            />
          ))}
        </section>
        <section aria-labelledby="release" className="grid gap-4 border-t-2 border-ink pt-4">
          <h2 id="release">Release {head.unit.fleetNumber}</h2>
          <Standing asked={asked} />
          {works && asked.mayRelease && <ReleaseForm key={asked.releases.length} action={release} caseId={caseId} newId={newId()} fleetNumber={head.unit.fleetNumber} />}
          {works && !asked.mayRelease && <p>You may measure. Releasing is a right that an administrator gives to a person.</p>}
          <Releases asked={asked} timeZone={head.timeZone} />
        </section>
      </div>
    </>
  );
}

function Standing({ asked: { whyNot, holds, checks, unitId } }: { asked: ReleaseView }) {
  if (whyNot || holds.length > 0) {
    return (
      <Notice kind="danger" title="Do not release">
        {whyNot} {holds.length > 0 && <>Against the unit still stands: {holds.join(', ')}. <Link className="underline" href={`/units/${unitId}`}>The unit’s page</Link> says by what.</>}
      </Notice>
    );
  }
  return checks.length > 0 ? <p><strong>Everything is in order.</strong> Whoever may release does so below, and “do not release” that has passed is lifted with it.</p> : null;
}

function Releases({ asked: { releases }, timeZone }: { asked: ReleaseView; timeZone: string }) {
  if (releases.length === 0) return null;
  return (
    <ul className="border-t border-ink">
      {releases.map(({ id, releasedAt, releasedBy, basis, note, on }) => (
        <li key={id} className="border-b border-rule py-2">
          <strong>Released</strong> by {releasedBy}, {timeText(releasedAt, timeZone)}{basis && ` (${basis})`}{note && `, “${note}”`}. On {on.map(({ name, answer }) => `${name}: ${answer}`).join('; ')}.
        </li>
      ))}
    </ul>
  );
}
