'use client';

import { useActionState } from 'react';
import type { ActionState } from '@/lib/auth/form';
import { SubmitButton } from '@/components/ui/SubmitButton';

type Action = (previous: ActionState, form: FormData) => Promise<ActionState>;

interface Props {
  invitationId: string;
  /** Tells the buttons of one row from those of another. */
  email: string;
  resend: Action;
  withdraw: Action;
}

export function InvitationButtons({ invitationId, email, resend, withdraw }: Props) {
  const [sent, send] = useActionState(resend, null);
  const [withdrawn, takeBack] = useActionState(withdraw, null);
  const refused = [sent, withdrawn].find((state) => state && !state.ok);
  return (
    <div className="flex flex-wrap items-center gap-2">
      <form action={send}>
        <input type="hidden" name="invitationId" value={invitationId} />
        <SubmitButton variant="quiet" size="small" pendingLabel="Sending…">Send again<span className="sr-only"> to {email}</span></SubmitButton>
      </form>
      <form action={takeBack}>
        <input type="hidden" name="invitationId" value={invitationId} />
        <SubmitButton variant="quiet" size="small" pendingLabel="Withdrawing…">Withdraw<span className="sr-only"> the invitation of {email}</span></SubmitButton>
      </form>
      <span role="status">{refused && !refused.ok ? refused.message : sent?.ok ? 'Sent again' : ''}</span>
    </div>
  );
}
