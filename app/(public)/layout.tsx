import type { ReactNode } from 'react';
import { AdviceFooter } from '@/components/shell/AdviceFooter';
import { SkipLink } from '@/components/shell/SkipLink';
import { Wordmark } from '@/components/shell/Wordmark';

/** Around the pages that need no sign-in. Pages bring no `main` of their own. */
export default function PublicLayout({ children }: { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header className="border-b-2 border-ink">
        <div className="mx-auto max-w-page px-4 sm:px-6">
          <Wordmark href="/" />
        </div>
      </header>
      <main id="main" tabIndex={-1} className="mx-auto w-full max-w-page flex-1 px-4 outline-none sm:px-6">
        {children}
      </main>
      <AdviceFooter />
    </div>
  );
}
