'use client';

import { useActionState } from 'react';
import { SubmitButton } from '@/components/ui/SubmitButton';
import type { ActionState } from '@/lib/auth/form';

interface Props {
  tokenId: string;
  /** Tells the button of one row from those of another. */
  name: string;
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
}

export function RevokeButton({ tokenId, name, action }: Props) {
  const [state, revoke] = useActionState(action, null);
  return (
    <form action={revoke}>
      <input type="hidden" name="tokenId" value={tokenId} />
      <SubmitButton variant="quiet" size="small" pendingLabel="Revoking…">Revoke<span className="sr-only"> the token {name}</span></SubmitButton>
      <span role="status">{state && !state.ok ? state.message : ''}</span>
    </form>
  );
}
