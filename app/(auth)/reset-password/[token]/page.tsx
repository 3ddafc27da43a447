import type { Metadata } from 'next';
import { Doorway } from '@/components/sign-in/Doorway';
import { DeadLink } from '@/components/sign-in/DeadLink';
import { ResetForm } from '@/components/sign-in/ResetForm';
import { ButtonLink } from '@/components/ui/Button';
import { unlessDead } from '@/lib/auth/page';
import { getVisitor } from '@/lib/auth/visitor';
import { viewPasswordReset } from '@/lib/services/password/reset';
import { reset } from '../actions';

export const metadata: Metadata = { title: 'A new password' };

export default async function ResetPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const link = await unlessDead(viewPasswordReset({ visitor: await getVisitor(), input: { token } }));
  if (!link.ok) {
    return <DeadLink action={<ButtonLink href="/reset-password">Ask for a new link</ButtonLink>}>{link.message}</DeadLink>;
  }
  return (
    <Doorway>
      <h1>Set a new password</h1>
      <ResetForm action={reset} token={token} />
    </Doorway>
  );
}
