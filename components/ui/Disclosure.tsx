import type { ReactNode } from 'react';
import { classes } from './classes';

interface Props {
  summary: ReactNode;
  children: ReactNode;
  /** Open from the start. */
  open?: boolean;
  /** Only one of those with the same name is open at a time. */
  name?: string;
  className?: string;
}

/**
 * More, for who wants it. Native `details`, so it works without script and is found by the page search.
 * @example <Disclosure summary="In decibans">…</Disclosure>
 */
export function Disclosure({ summary, children, open, name, className }: Props) {
  return (
    <details className={classes('disclosure', className)} open={open} name={name}>
      <summary className="min-h-touch py-2 font-bold">{summary}</summary>
      <div className="pb-4 pl-[1.85rem]">{children}</div>
    </details>
  );
}
