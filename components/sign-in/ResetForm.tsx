'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { ButtonLink } from '@/components/ui/Button';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

interface Props {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  token: string;
}

export function ResetForm({ action, token }: Props) {
  const form = useForm(action);
  if (form.saved) {
    return (
      <div role="status" className="grid justify-items-start gap-4">
        <p>Your password is set, and you are signed out on every device.</p>
        <ButtonLink href="/sign-in">Sign in</ButtonLink>
      </div>
    );
  }
  return (
    <Form form={form}>
      <input type="hidden" name="token" value={token} />
      <TextField
        label="New password"
        hint="12 characters or more; a few words in a row do well"
        type="password"
        autoComplete="new-password"
        required
        {...form.field('password')}
      />
      <SubmitButton>Set the password</SubmitButton>
    </Form>
  );
}
