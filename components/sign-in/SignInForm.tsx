'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

interface Props {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  /** Where to go on to. */
  next?: string;
}

export function SignInForm({ action, next }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} errorTitle="Not signed in">
      {next && <input type="hidden" name="next" value={next} />}
      <TextField label="Email address" type="email" autoComplete="username" required {...form.field('email')} />
      <TextField label="Password" type="password" autoComplete="current-password" required {...form.field('password')} />
      <SubmitButton pendingLabel="Signing in…">Sign in</SubmitButton>
    </Form>
  );
}
