'use client';

import { useEffect, useRef } from 'react';
import { Button, ButtonLink } from '@/components/ui/Button';

interface Props {
  error: Error & { digest?: string };
  retry: () => void;
  homeHref: string;
  /** What was kept, in a sentence. */
  kept?: string;
}

/**
 * A page that broke: what happened, what was kept, what to do. The reference is Next's digest of a server error, under
 * which instrumentation.ts puts it into the log. Takes the focus, since it replaces what had it.
 */
export function ErrorPanel({ error: { digest }, retry, homeHref, kept = 'Whatever was saved before is kept.' }: Props) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <section className="grid gap-4 py-10">
      <h1 ref={heading} tabIndex={-1} className="outline-none">This page did not come up</h1>
      <p className="max-w-prose">Something failed {digest ? 'on our side' : 'while the page was drawn'}. {kept}</p>
      <p className="max-w-prose">
        Try again. If it fails again, tell your administrator{' '}
        {digest ? <>the reference <strong className="figure" data-reference>{digest}</strong>; the log has it.</> : 'what you were doing.'}
      </p>
      <div className="flex flex-wrap gap-3">
        <Button onClick={retry}>Try again</Button>
        <ButtonLink variant="quiet" href={homeHref}>To the start</ButtonLink>
      </div>
    </section>
  );
}
