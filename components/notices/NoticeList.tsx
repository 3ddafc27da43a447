import { Tag } from '@/components/ui/Tag';
import { NoticeButton, type NoticeAction } from './NoticeButton';

interface Props {
  notices: readonly { id: string; sentence: string; place: string | null; createdAt: string; readAt: string | null }[];
  /** Marks it as read and goes there. */
  open: NoticeAction;
  markRead: NoticeAction;
}

const instant = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

export function NoticeList({ notices, open, markRead }: Props) {
  return (
    <ol className="border-t border-ink">
      {notices.map(({ id, sentence, place, createdAt, readAt }) => (
        <li key={id} className="grid gap-2 border-b border-rule py-3">
          <p className={readAt === null ? 'font-bold' : undefined}>{sentence}</p>
          <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
            <time dateTime={createdAt} className="figure text-ink-soft">{instant.format(new Date(createdAt))}</time>
            {readAt === null && <Tag tone="strong">Unread</Tag>}
            {place !== null && <NoticeButton action={open} noticeId={id}>Go there<span className="sr-only">: {sentence}</span></NoticeButton>}
            {readAt === null && <NoticeButton action={markRead} noticeId={id}>Mark read<span className="sr-only">: {sentence}</span></NoticeButton>}
          </div>
        </li>
      ))}
    </ol>
  );
}
