import type { Metadata } from 'next';
import { CaseNav } from '@/components/case/CaseNav';
import { CheckAtStage } from '@/components/case/CheckAtStage';
import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { PhotosOfCase } from '@/components/photos/PhotosOfCase';
import { SeenAtRepair } from '@/components/repair/SeenAtRepair';
import { moneyText } from '@/components/repair/money';
import { ChosenRepair, EndedRepairs } from '@/components/repair/ChosenRepair';
import { PlannedRemedy } from '@/components/repair/PlannedRemedy';
import { ChooseForm } from '@/components/repair/RepairForms';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { percent } from '@/lib/schemas/percent';
import type { RepairPlanView, RepairView } from '@/lib/schemas/repair';
import { listAssignable } from '@/lib/services/case/assignable';
import { readCase } from '@/lib/services/case/read';
import { listRepairs } from '@/lib/services/repair/list';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { listPhotos } from '@/lib/services/photo/list';
import { QueryProvider } from '@/lib/query/provider';
import { choose, endIt, planIt, readCheckCautions, readRepairCautions, saySo, see } from './actions';

export const metadata: Metadata = { title: 'Repair plan' };

/** What to repair, and in which order, as the case stands now; and what was chosen and done of it. */
export default async function RepairPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const view = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const { head, rulebook, state } = view;
  const plan = await readRepairPlan({ ctx, input: { caseId: id } });
  const { repairs } = await listRepairs({ ctx, input: { caseId: id } });
  const people = (await listAssignable({ ctx, input: {} })).map((person) => ({ value: person.id, label: person.name }));
  const works = may(ctx.roles, 'case.work') && state.status !== 'closed';
  const caseId = head.id;
  const atHand = repairs.filter(({ endedAt }) => endedAt === null);
  const open = plan.remedies.filter(({ remedyId }) => !atHand.some((repair) => repair.remedyId === remedyId));
  const read = ({ remedyId, name, toRead }: { remedyId: string; name: string; toRead: string[] }) =>
    works ? <ReadCautionsForm action={readRepairCautions} of={{ caseId, remedyId }} about={name} cautionIds={toRead} /> : null;
  const seen = ({ name, place, looks }: RepairView) => (
    <SeenAtRepair
      about={name}
      checks={looks.flatMap((checkId) => rulebook.checks[checkId] ?? [])}
      seen={state.findings.filter(({ stage, current }) => current && stage.kind === 'after-remedy' && stage.remedy === place)}
      timeZone={head.timeZone}
      form={(check) => <CheckAtStage {...{ view, check }} stage={{ kind: 'after-remedy', remedy: place }} newId={newId()} actions={{ readCautions: readCheckCautions, answer: see }} />}
    />
  );
  return (
    <QueryProvider>
      <PageHeader
        title="Repair plan"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${caseId}` }]}
        lead="In the order of least expected cost, as the ranking stands now. Each answer can change it."
      />
      <CaseNav caseId={caseId} here="/repair" />
      <PhotosOfCase view={view} initial={await listPhotos({ ctx, input: { caseId } })}>
      <div className="grid max-w-4xl gap-8">
        {atHand.length > 0 && (
          <section aria-labelledby="at-hand" className="grid gap-6">
            <h2 id="at-hand">At hand</h2>
            {atHand.map((repair) => (
              <ChosenRepair key={repair.id} {...{ repair, caseId, people }} timeZone={head.timeZone} newIds={repair.steps.map(() => newId())} seen={seen(repair)} read={read(repair)} actions={{ planIt, saySo, endIt }} />
            ))}
          </section>
        )}
        <section aria-labelledby="order" className="grid gap-4">
          <h2 id="order">{atHand.length > 0 ? 'Then, in this order' : 'In this order'}</h2>
          {open.length === 0 && <EmptyState title={atHand.length > 0 ? 'Nothing else is worth its cost' : 'No repair is worth its cost yet'}>{atHand.length > 0 ? 'By what is known, the rest is best left as it is.' : 'Leaving everything as it is costs least by what is known. Check further, or call what you have seen.'}</EmptyState>}
          <ol className="grid gap-6">
            {open.map((remedy, i) => (
              <PlannedRemedy
                key={remedy.remedyId}
                remedy={remedy}
                place={i + 1}
                currency={plan.currency}
                causeName={(causeId) => rulebook.causes[causeId]?.name ?? causeId}
                read={read(remedy)}
                choose={works ? <ChooseForm action={choose} caseId={caseId} about={remedy.name} people={people} newId={newId()} remedyId={remedy.remedyId} isFirst={i === 0} /> : null}
              />
            ))}
          </ol>
        </section>
        <Reckoning plan={plan} />
        <EndedRepairs repairs={repairs.filter(({ endedAt }) => endedAt !== null)} timeZone={head.timeZone} />
      </div>
      </PhotosOfCase>
    </QueryProvider>
  );
}

/** Where the order comes from, in figures. */
function Reckoning({ plan }: { plan: RepairPlanView }) {
  const money = (amount: number) => <span className="figure whitespace-nowrap">{moneyText(amount, plan.currency)}</span>;
  return (
    <section aria-labelledby="reckoning" className="grid max-w-prose gap-2">
      <h2 id="reckoning">How it was reckoned</h2>
      <p>
        This order is expected to cost {money(plan.expectedCost)}, stopping when the cause is found; leaving everything as it is, {money(plan.costOfLeaving)}. An hour of work counts {money(plan.labourRatePerHour)}
        {plan.rateFrom === 'organisation' ? ', as your organisation set it' : ', as the rulebook takes it until your organisation sets its own'}. Parts, minutes and the cost of a comeback are the rulebook’s.
      </p>
      <p>{plan.exact ? 'No other choice or order of its remedies costs less.' : 'There are too many remedies to try every order: this is a good one, not surely the best.'}</p>
      {plan.left.length > 0 && (
        <p>
          Not in the plan, because no remedy of it removes them: {plan.left.map(({ name, p }) => `${name} (${percent(p)})`).join(', ')}.
        </p>
      )}
    </section>
  );
}
