import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { SumDesk } from '@/components/bench/SumDesk';
import { PageHeader } from '@/components/ui/PageHeader';
import { sumOf, waysTo } from '@/lib/air-and-oil/sums';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { QueryProvider } from '@/lib/query/provider';
import { firstOfEach } from '@/lib/schemas/list';
import { readSumTarget } from '@/lib/services/bench/target';
import { writingOf } from '@/lib/services/case/writing';

interface Props {
  params: Promise<{ sum: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: sumOf((await params).sum)?.name ?? 'Bench' };
}

export default async function SumPage({ params, searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['bench.use']);
  const sum = sumOf((await params).sum);
  if (!sum) notFound();
  const { case: caseId, check: checkId, ...search } = firstOfEach(await searchParams) as Record<string, string>;
  const found = caseId && checkId && may(ctx.roles, 'case.see') ? await orNotFound(readSumTarget({ ctx, input: { caseId, checkId, sumId: sum.id } })) : null;
  return (
    <>
      <PageHeader
        title={sum.name}
        lead={sum.purpose}
        breadcrumbs={[{ label: 'Bench', href: '/bench' }, ...(found ? [{ label: `For ${found.target.caseName}`, href: `/cases/${found.target.caseId}` }] : [])]}
      />
      <OtherWays sumId={sum.id} search={caseId && checkId ? { case: caseId, check: checkId } : {}} />
      <QueryProvider><SumDesk sumId={sum.id} search={search} known={found?.known ?? {}} writing={writingOf(ctx)} target={found?.target ?? null} /></QueryProvider>
    </>
  );
}

/** Other readings that lead to the same figure; renders nothing where there are none. */
function OtherWays({ sumId, search }: { sumId: string; search: Record<string, string> }) {
  const others = waysTo(sumId).slice(1);
  if (others.length === 0) return null;
  const query = new URLSearchParams(search).toString();
  return (
    <p className="mb-6">
      Another way:{' '}
      {others.map(({ id, name }) => <Link key={id} className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/bench/${id}${query && `?${query}`}`}>{name}</Link>)}
    </p>
  );
}
