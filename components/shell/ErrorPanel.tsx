'use client';

import { useEffect, useRef } from 'react';
import { Button, ButtonLink } from '@/components/ui/Button';

interface Props {
  /** Next's own reference of a server error; the log holds the same. */
  digest?: string;
  retry: () => void;
  homeHref: string;
}

/** A page that broke: what happened, what was kept, what to do. Takes the focus, since it replaces what had it. */
export function ErrorPanel({ digest, retry, homeHref }: Props) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <section className="grid gap-4 py-10">
      <h1 ref={heading} tabIndex={-1} className="outline-none">This page did not come up</h1>
      <p className="max-w-prose">
        Something failed on our side. Whatever was saved before is kept. Try again; if it fails again, tell your administrator
        {digest ? (
          <>
            {' '}the reference <span className="figure font-bold">{digest}</span>.
          </>
        ) : (
          ' what you were doing.'
        )}
      </p>
      <div className="flex flex-wrap gap-3">
        <Button onClick={retry}>Try again</Button>
        <ButtonLink variant="quiet" href={homeHref}>To the start</ButtonLink>
      </div>
    </section>
  );
}
