import type { Metadata } from 'next';
import { differenceText, shareText } from '@/components/gate/outcome-words';
import { DataTable } from '@/components/ui/DataTable';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { readGateOutcome } from '@/lib/services/gate/outcome';

export const metadata: Metadata = { title: 'The gate' };

/** Whether it pays to ask before a compressor is ordered. */
export default async function GateOutcomePage() {
  const ctx = await pageContext(PERMITTED['fleet.see']);
  const { gated, saidFit, saidNotYet, ungated, horizonDays, daysToFit, currency, comebackDifference, claimDifference } = await readGateOutcome({ ctx, input: {} });
  const money = new Intl.NumberFormat('en', { style: 'currency', currency, maximumFractionDigits: 0 });
  const rows = [
    { name: 'Through the gate', ...gated },
    { name: 'It said “fit”', ...saidFit },
    { name: 'It said “not yet”', ...saidNotYet },
    { name: 'Past the gate', ...ungated },
  ];
  return (
    <>
      <PageHeader title="The gate" lead={`Compressors fitted since the first gate was made, and how many came back within ${horizonDays} days.`} />
      <div className="grid gap-8">
        <DataTable
          caption="Fits that could be followed, with 95 % intervals"
          rows={rows}
          rowKey={({ name }) => name}
          columns={[
            { key: 'name', header: 'Fitted', rowHeader: true, cell: ({ name }) => name },
            { key: 'back', header: 'Came back', cell: ({ comebacks }) => shareText(comebacks) },
            { key: 'claims', header: 'Claim paid', cell: ({ claims }) => shareText(claims) },
            { key: 'paid', header: 'Paid in all', numeric: true, cell: ({ paidAmount }) => money.format(paidAmount) },
            { key: 'lost', header: 'Lost to follow-up', numeric: true, cell: ({ lost }) => lost },
            { key: 'recent', header: 'Too recent', numeric: true, cell: ({ tooRecent }) => tooRecent },
          ]}
        />
        <section aria-labelledby="difference" className="grid max-w-prose gap-2">
          <h2 id="difference">The difference</h2>
          <p>{differenceText('Came back', comebackDifference)}</p>
          <p>{differenceText('Claim paid', claimDifference)}</p>
          <p className="text-ink-soft">
            Two comparisons. Workshops chose when to use the gate; it is not a trial. A fit counts as gated when its unit passed a gate in the {daysToFit} days before it. It came back when a case was
            opened on the unit in the {horizonDays} days after it, whatever was complained of.
          </p>
        </section>
      </div>
    </>
  );
}
