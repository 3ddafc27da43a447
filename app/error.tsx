'use client';

import { ErrorPanel } from '@/components/shell/ErrorPanel';
import { Wordmark } from '@/components/shell/Wordmark';

/** Where the shell itself could not be drawn. */
export default function PageError(props: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <>
      <header className="border-b-2 border-ink">
        <div className="mx-auto max-w-page px-4 sm:px-6"><Wordmark href="/" /></div>
      </header>
      <main className="mx-auto max-w-page px-4 sm:px-6">
        <ErrorPanel {...props} homeHref="/" />
      </main>
    </>
  );
}
