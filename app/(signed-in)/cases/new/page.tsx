import type { Metadata } from 'next';
import { OpenCaseForm } from '@/components/case/OpenCaseForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { QueryProvider } from '@/lib/query/provider';
import { readOpening } from '@/lib/services/case/opening';
import { unitDefinition } from '@/lib/units';
import { openCaseFromForm } from '../actions';

export const metadata: Metadata = { title: 'Open a case' };

/** An address with nonsense in it opens the form without a unit. */
const idFrom = (value: string | string[] | undefined) => (typeof value === 'string' && /^[0-9a-f-]{36}$/.test(value) ? value : undefined);

export default async function NewCasePage({ searchParams }: { searchParams: Promise<Record<string, string | string[] | undefined>> }) {
  const ctx = await pageContext(PERMITTED['case.work']);
  const { unit } = await searchParams;
  const opening = await readOpening({ ctx, input: { unitId: idFrom(unit) } });
  return (
    <QueryProvider>
      <PageHeader
        title="Open a case"
        lead="Which vehicle, what is wrong, how far it has run. The rest is asked one by one."
        breadcrumbs={[{ label: 'Cases', href: '/cases' }]}
      />
      <OpenCaseForm
        action={openCaseFromForm}
        ids={{ caseId: newId(), unitId: newId() }}
        odometerUnit={unitDefinition('distance', ctx.person.units.distance).symbol}
        {...opening}
      />
    </QueryProvider>
  );
}
