import type { ReactNode } from 'react';
import { AdviceFooter } from './AdviceFooter';
import { AppHeader, type AppHeaderProps } from './AppHeader';
import { SkipLink } from './SkipLink';

/** Everything around a signed-in page. Pages bring their own `PageHeader` and never a `main`. */
export function SignedInShell({ children, ...header }: AppHeaderProps & { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <AppHeader {...header} />
      <main id="main" tabIndex={-1} className="mx-auto w-full max-w-page flex-1 px-4 pt-6 outline-none sm:px-6">
        {children}
      </main>
      <AdviceFooter />
    </div>
  );
}
