import type { Metadata } from 'next';
import { Wordmark } from '@/components/shell/Wordmark';
import { NotFoundPage } from '@/components/states/NotFoundPage';
import { ButtonLink } from '@/components/ui/Button';
import { homeFor } from '@/lib/auth/navigation';
import { getContext } from '@/lib/auth/session';
import { SignedInFrame } from './signed-in-frame';

export const metadata: Metadata = { title: 'Not found' };

const WHY = 'It was never here, it was removed, or it belongs to another organisation.';

/** An address that no page has: inside the shell for whoever is signed in. */
export default async function NotFound() {
  const ctx = await getContext();
  if (ctx) {
    return (
      <SignedInFrame ctx={ctx}>
        <NotFoundPage kind="page" to={{ href: homeFor(ctx.roles), label: 'To your pages' }}>{WHY}</NotFoundPage>
      </SignedInFrame>
    );
  }
  return (
    <main className="mx-auto grid min-h-dvh max-w-page content-center gap-4 px-4 sm:px-6">
      <Wordmark href="/" />
      <h1>Nothing at this address</h1>
      <p className="max-w-prose">{WHY} Nothing was changed.</p>
      <p><ButtonLink href="/">To the start</ButtonLink></p>
    </main>
  );
}
