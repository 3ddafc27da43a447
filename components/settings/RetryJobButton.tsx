'use client';

import { useActionState } from 'react';
import { SubmitButton } from '@/components/ui/SubmitButton';
import type { ActionState } from '@/lib/auth/form';
import type { JobState } from '@/lib/schemas/job';

type Retried = ActionState<{ id: string; isRetried: boolean; state: JobState }>;

interface Props {
  jobId: string;
  /** Tells the button of one row from those of others. */
  what: string;
  action: (previous: Retried, form: FormData) => Promise<Retried>;
}

const saying = (state: Retried) => {
  if (state === null) return '';
  if (!state.ok) return state.message;
  return state.result.isRetried ? 'It waits for its turn' : `It had not failed any more: it is ${state.result.state}`;
};

export function RetryJobButton({ jobId, what, action }: Props) {
  const [state, send] = useActionState(action, null);
  return (
    <form action={send} className="flex flex-wrap items-center gap-2">
      <input type="hidden" name="jobId" value={jobId} />
      <SubmitButton variant="quiet" size="small" pendingLabel="Asking…">Try again<span className="sr-only">: {what}</span></SubmitButton>
      <span role="status">{saying(state)}</span>
    </form>
  );
}
