import type { Metadata } from 'next';
import { cookies } from 'next/headers';
import { HAND_COOKIE, handFrom } from '@/components/case/hand';
import { HistoryDesk } from '@/components/case/history/HistoryDesk';
import { OilPathCompositions } from '@/components/oil-path/compositions';
import { PhotosOfCase } from '@/components/photos/PhotosOfCase';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { stepAt, stepsOf } from '@/lib/case/steps';
import { QueryProvider } from '@/lib/query/provider';
import { firstOfEach } from '@/lib/schemas/list';
import { readCase } from '@/lib/services/case/read';
import { listPhotos } from '@/lib/services/photo/list';
import { decimalMarkOf } from '@/lib/services/units-of-measure';

export const metadata: Metadata = { title: 'History of a case' };

interface Props {
  params: Promise<{ id: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Any moment of a case as it was, and two of them compared. */
export default async function CaseHistoryPage({ params, searchParams }: Props) {
  const { id } = await params;
  const asked = firstOfEach(await searchParams);
  const ctx = await pageContext(PERMITTED['case.see']);
  const read = (at?: string) => orNotFound(readCase({ ctx, input: { caseId: id, at } }));
  const now = await read();
  const steps = stepsOf(now.moments);
  const [at, withAt] = [instantOf(asked.at), instantOf(asked.with)];
  const instants = [...new Set([steps[stepAt(steps, at)]?.at, withAt === null ? undefined : steps[stepAt(steps, withAt)]?.at].flatMap((one) => one ?? []))];
  const views = await Promise.all(instants.map(read));
  const known = Object.fromEntries(views.map(({ state, reasons }, i) => [instants[i] ?? '', { state, reasons }]));
  const photos = await listPhotos({ ctx, input: { caseId: now.head.id } });

  return (
    <QueryProvider>
      <PageHeader
        title={`Case ${now.head.number}: history`}
        breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: `Case ${now.head.number}: ${now.head.unit.fleetNumber}`, href: `/cases/${now.head.id}` }]}
        lead="The page and its ranking as they were at any moment. Nothing can be answered here."
      />
      <PhotosOfCase view={{ ...now, ...known[instants[0] ?? ''] }} initial={photos}>
        <HistoryDesk
          view={{ ...now, otherHolds: [] }}
          steps={steps}
          known={known}
          at={at}
          withAt={withAt}
          drawing={<OilPathCompositions />}
          hand={handFrom((await cookies()).get(HAND_COOKIE)?.value)}
          decimalMark={decimalMarkOf(ctx.organisation.country) ?? ','}
        />
      </PhotosOfCase>
    </QueryProvider>
  );
}

/** What an address says of an instant; nonsense is none. */
const instantOf = (text: string | undefined): string | null => (text && !Number.isNaN(Date.parse(text)) ? text : null);
