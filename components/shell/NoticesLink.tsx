import Link from 'next/link';
import { classes } from '@/components/ui/classes';

/** The way to the notices, with how many are unread: "Notices, 3 unread" to whoever listens. */
export function NoticesLink({ unread, className }: { unread: number; className?: string }) {
  return (
    <Link href="/notices" prefetch={false} className={classes('label flex min-h-touch items-center gap-2 px-3 hover:bg-sunk print:hidden', className)}>
      Notices<Unread count={unread} />
    </Link>
  );
}

/** Nothing when all was read. */
export function Unread({ count, of = '' }: { count: number; of?: string }) {
  if (count === 0) return null;
  return (
    <>
      <span aria-hidden="true" className="figure rounded bg-ink px-1.5 text-[0.8125rem] text-paper">{count}</span>
      <span className="sr-only">{`, ${count} unread${of}`}</span>
    </>
  );
}
