import Link from 'next/link';
import type { ReactNode } from 'react';

/** A line at the head of a case: something that goes on for days beside its checks, and where it is seen to. */
export const GoingOn = ({ href, link, children }: { href: string; link: string; children: ReactNode }) => (
  <p className="mb-4 border-l-4 border-ink pl-3">
    {children}{' '}
    <Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={href}>{link}</Link>
  </p>
);
