import type { Metadata } from 'next';
import { NoticesForm } from '@/components/settings/NoticesForm';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { readNoticeChoices } from '@/lib/services/notice/choices';
import { saveNotices } from './actions';

export const metadata: Metadata = { title: 'How you are told' };

export default async function NoticeSettingsPage() {
  const ctx = await pageContext();
  return (
    <>
      <PageHeader
        title="How you are told"
        lead="Every notice stands in the app. Here you set which come by mail as well, for this organisation: at once, or all of a day in one mail at six in the morning where you work. You are never told of what you did yourself."
      />
      <NoticesForm action={saveNotices} choices={await readNoticeChoices({ ctx, input: {} })} />
    </>
  );
}
