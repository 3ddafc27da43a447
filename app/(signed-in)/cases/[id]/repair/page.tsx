import type { Metadata } from 'next';
import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { moneyText } from '@/components/repair/money';
import { PlannedRemedy } from '@/components/repair/PlannedRemedy';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { percent } from '@/lib/schemas/percent';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import type { RepairPlanView } from '@/lib/schemas/repair';
import { readCase } from '@/lib/services/case/read';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { readRepairCautions } from './actions';

export const metadata: Metadata = { title: 'Repair plan' };

/** What to repair, and in which order, as the case stands now. */
export default async function RepairPage({ params }: { params: Promise<{ id: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id } = await params;
  const { head, rulebook } = await orNotFound(readCase({ ctx, input: { caseId: id } }));
  const plan = await readRepairPlan({ ctx, input: { caseId: id } });
  const works = may(ctx.roles, 'case.work');
  const causeName = (causeId: string) => rulebook.causes[causeId]?.name ?? causeId;
  return (
    <>
      <PageHeader
        title="Repair plan"
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${head.number}: ${head.unit.fleetNumber}`, href: `/cases/${head.id}` }]}
        lead="In the order of least expected cost, as the ranking stands now. Each answer can change it."
      />
      <div className="grid max-w-4xl gap-8">
        <section aria-labelledby="order" className="grid gap-4">
          <h2 id="order">In this order</h2>
          {plan.remedies.length === 0 && <EmptyState title="No repair is worth its cost yet">Leaving everything as it is costs least by what is known. Check further, or call what you have seen.</EmptyState>}
          <ol className="grid gap-6">
            {plan.remedies.map((remedy, i) => (
              <PlannedRemedy
                key={remedy.remedyId}
                remedy={remedy}
                place={i + 1}
                currency={plan.currency}
                causeName={causeName}
                read={works ? <ReadCautionsForm action={readRepairCautions} of={{ caseId: head.id, remedyId: remedy.remedyId }} about={remedy.name} cautionIds={remedy.toRead} /> : null}
              />
            ))}
          </ol>
        </section>
        <Reckoning plan={plan} />
      </div>
    </>
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
