import Link from 'next/link';
import { OilPathMark } from '@/components/oil-path/OilPathMark';

/** Mark and name; leads home. */
export function Wordmark({ href }: { href: string }) {
  return (
    <Link href={href} className="heading flex min-h-touch items-center gap-2.5 text-2xl tracking-tight">
      <OilPathMark className="size-7" />
      Carryover
    </Link>
  );
}
