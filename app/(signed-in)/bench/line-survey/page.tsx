import type { Metadata } from 'next';
import { SurveyDesk } from '@/components/bench/SurveyDesk';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { LINE_SURVEY } from '@/lib/bench/line-survey';
import { firstOfEach } from '@/lib/schemas/list';
import { writingOf } from '@/lib/services/case/writing';

export const metadata: Metadata = { title: LINE_SURVEY.name };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function LineSurveyPage({ searchParams }: Props) {
  const ctx = await pageContext(PERMITTED['bench.use']);
  return (
    <>
      <PageHeader title={LINE_SURVEY.name} lead={LINE_SURVEY.purpose} breadcrumbs={[{ label: 'Bench', href: '/bench' }]} />
      <SurveyDesk search={firstOfEach(await searchParams) as Record<string, string>} writing={writingOf(ctx)} />
    </>
  );
}
