'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

export function RequestResetForm({ action }: { action: (previous: ActionState, form: FormData) => Promise<ActionState> }) {
  const form = useForm(action);
  if (form.saved) {
    return (
      <p role="status">
        If somebody signs in with this address, a mail with a link is on its way. It works once and for an hour. Look where unwanted mail
        goes if it does not come.
      </p>
    );
  }
  return (
    <Form form={form} errorTitle="Not sent yet">
      <TextField label="Email address" type="email" autoComplete="username" required {...form.field('email')} />
      <SubmitButton pendingLabel="Sending…">Send a link</SubmitButton>
    </Form>
  );
}
