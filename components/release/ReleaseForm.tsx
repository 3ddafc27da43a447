'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Hidden } from '@/components/forms/Hidden';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

type Written = ActionState<{ id: string; caseId: string }>;

interface Props {
  action: (previous: Written, form: FormData) => Promise<Written>;
  caseId: string;
  newId: string;
  fleetNumber: string;
}

/** Releases the unit: who may, sees it; the service refuses what is missing. */
export function ReleaseForm({ action, caseId, newId, fleetNumber }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} label={`Release ${fleetNumber}`} errorTitle="Not released">
      <Hidden values={{ id: newId, caseId }} />
      <TextField label="Note" autoComplete="off" required={false} {...form.field('note')} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">Release {fleetNumber}</SubmitButton>
      </div>
    </Form>
  );
}
