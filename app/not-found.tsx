import type { Metadata } from 'next';
import { Doorway } from '@/components/sign-in/Doorway';
import { NotFoundPage } from '@/components/states/NotFoundPage';
import { ButtonLink } from '@/components/ui/Button';
import { homeFor } from '@/lib/auth/navigation';
import { getContext } from '@/lib/auth/session';
import PublicLayout from './(public)/layout';
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
    <PublicLayout>
      <Doorway>
        <h1>Nothing at this address</h1>
        <p>{WHY} Nothing was changed.</p>
        <p><ButtonLink href="/">To the start</ButtonLink></p>
      </Doorway>
    </PublicLayout>
  );
}
