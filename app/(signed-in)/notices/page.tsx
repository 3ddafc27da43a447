import type { Metadata } from 'next';
import Link from 'next/link';
import { NoticeButton } from '@/components/notices/NoticeButton';
import { NoticeList } from '@/components/notices/NoticeList';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { Pager } from '@/components/ui/Pager';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { firstOfEach, listHref } from '@/lib/schemas/list';
import { listNotices } from '@/lib/services/notice/list';
import { markAllRead, markRead, openNotice } from './actions';

export const metadata: Metadata = { title: 'Notices' };

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function NoticesPage({ searchParams }: Props) {
  const ctx = await pageContext();
  const { rows, unread, total, page, pageCount } = await orNotFound(listNotices({ ctx, input: firstOfEach(await searchParams) }));
  return (
    <>
      <PageHeader
        title="Notices"
        lead={<>What you were told, the newest first. Times are universal time. Which come by mail as well is yours to <Link href="/settings/notices">set</Link>.</>}
      />
      {rows.length === 0 ? (
        <EmptyState title="No notices">Work that is given to you, repairs that did not hold, readings that are due and mail that could not be delivered stand here.</EmptyState>
      ) : (
        <div className="grid gap-6">
          {unread > 0 && <NoticeButton action={markAllRead}>Mark all {unread} read</NoticeButton>}
          <NoticeList notices={rows} open={openNotice} markRead={markRead} />
          <Pager label="Pages of notices" page={page} pageCount={pageCount} total={total} hrefFor={(to) => listHref('/notices', {}, { page: to })} />
        </div>
      )}
    </>
  );
}
