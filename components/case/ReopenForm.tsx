'use client';

import { useActionState } from 'react';
import { FormErrorSummary } from '@/components/ui/FormErrorSummary';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextareaField } from '@/components/ui/TextareaField';
import type { ActionState } from '@/lib/auth/form';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  eventId: string;
  caseId: string;
}

/** Takes the call back, with the reason why. */
export function ReopenForm({ action, eventId, caseId }: Props) {
  const [result, submit] = useActionState(action, null);
  const failed = result && !result.ok ? result : null;
  const typed = failed?.values.reason;
  return (
    <form action={submit} className="grid max-w-prose gap-4" noValidate>
      <FormErrorSummary errors={failed?.fields} formError={failed?.message} title="Not reopened yet" />
      <input type="hidden" name="id" value={eventId} />
      <input type="hidden" name="caseId" value={caseId} />
      <TextareaField label="Why reopen it?" name="reason" defaultValue={typeof typed === 'string' ? typed : undefined} error={failed?.fields.reason} required />
      <div><SubmitButton variant="quiet" pendingLabel="Reopening…">Reopen the case</SubmitButton></div>
    </form>
  );
}
