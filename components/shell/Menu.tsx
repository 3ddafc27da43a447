'use client';

import { usePathname } from 'next/navigation';
import { useRef, type ReactNode } from 'react';
import { classes } from '@/components/ui/classes';

interface Props {
  summary: ReactNode;
  children: ReactNode;
  className?: string;
  panelClassName?: string;
}

/**
 * A panel under the head of the page. It opens without script; with it, it closes on Escape, when the
 * focus goes elsewhere, and after going to another page (the key makes it a new, closed element).
 */
export function Menu({ summary, children, className, panelClassName }: Props) {
  const pathname = usePathname();
  const menu = useRef<HTMLDetailsElement>(null);
  const close = () => menu.current?.removeAttribute('open');
  return (
    <details
      key={pathname}
      ref={menu}
      className={classes('group print:hidden', className)}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || !menu.current?.open) return;
        close();
        menu.current.querySelector('summary')?.focus();
      }}
      onBlur={(event) => {
        if (event.relatedTarget && !event.currentTarget.contains(event.relatedTarget)) close();
      }}
    >
      <summary className="label flex min-h-touch list-none items-center gap-2 rounded border border-transparent px-3 group-open:border-ink group-open:bg-sheet hover:bg-sunk [&::-webkit-details-marker]:hidden">
        {summary}
      </summary>
      <div className={classes('z-10 border border-ink bg-sheet p-4', panelClassName)}>{children}</div>
    </details>
  );
}
