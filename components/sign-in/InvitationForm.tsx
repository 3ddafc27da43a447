'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

interface Props {
  action: (previous: ActionState<{ email: string }>, form: FormData) => Promise<ActionState<{ email: string }>>;
  token: string;
  email: string;
  /** The address has a sign-in already: its password is asked instead of a new one. */
  hasSignIn: boolean;
}

export function InvitationForm({ action, token, email, hasSignIn }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} errorTitle="Not joined yet">
      <input type="hidden" name="token" value={token} />
      <TextField label="Email address" name="email" type="email" autoComplete="username" defaultValue={email} readOnly />
      {hasSignIn ? (
        <TextField
          label="Password"
          hint="You have a sign-in with this address: enter its password."
          type="password"
          autoComplete="current-password"
          required
          {...form.field('password')}
        />
      ) : (
        <>
          <TextField label="Your name" hint="As your colleagues know you" autoComplete="name" required {...form.field('name')} />
          <TextField
            label="Choose a password"
            hint="12 characters or more; a few words in a row do well"
            type="password"
            autoComplete="new-password"
            required
            {...form.field('password')}
          />
        </>
      )}
      <SubmitButton pendingLabel="Joining…">Join</SubmitButton>
    </Form>
  );
}
