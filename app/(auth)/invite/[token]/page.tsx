import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/Button';
import { Doorway } from '@/components/sign-in/Doorway';
import { DeadLink } from '@/components/sign-in/DeadLink';
import { InvitationForm } from '@/components/sign-in/InvitationForm';
import { unlessDead } from '@/lib/auth/page';
import { getVisitor } from '@/lib/auth/visitor';
import { viewInvitation } from '@/lib/services/invitation/accept';
import { join } from './actions';

export const metadata: Metadata = { title: 'Invitation' };

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const invitation = await unlessDead(viewInvitation({ visitor: await getVisitor(), input: { token } }));
  if (!invitation.ok) {
    return <DeadLink action={<ButtonLink href="/" variant="quiet">To the start</ButtonLink>}>{invitation.message}</DeadLink>;
  }
  const { organisationName, email, hasSignIn } = invitation.result;
  return (
    <Doorway>
      <div className="grid gap-2">
        <h1>Join {organisationName}</h1>
        <p className="text-ink-soft">In Carryover you find out why a compressor passes oil or fails before anybody fits another one.</p>
      </div>
      <InvitationForm action={join} token={token} email={email} hasSignIn={hasSignIn} />
    </Doorway>
  );
}
