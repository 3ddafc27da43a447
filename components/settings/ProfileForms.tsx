'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

type Action<Result = void> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

export function RenameForm({ action, name }: { action: Action; name: string }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Change your name" saved="Your name is changed.">
      <TextField label="Name" autoComplete="name" required {...form.field('name', name)} />
      <SubmitButton>Save the name</SubmitButton>
    </Form>
  );
}

export function PasswordForm({ action, email }: { action: Action<{ email: string }>; email: string }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Change your password" saved="Your password is changed. You are signed out on every other device.">
      {/* For password keepers, which want to know whose password it is. */}
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <TextField label="Present password" type="password" autoComplete="current-password" required {...form.field('current')} />
      <TextField
        label="New password"
        hint="12 characters or more; a few words in a row do well"
        type="password"
        autoComplete="new-password"
        required
        {...form.field('password')}
      />
      <SubmitButton>Change the password</SubmitButton>
    </Form>
  );
}

export function ChangeOrganisationForm({ action, organisations }: { action: Action<{ organisationId: string }>; organisations: readonly { id: string; name: string }[] }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Another organisation">
      <SelectField label="Organisation" required options={organisations.map(({ id, name }) => ({ value: id, label: name }))} {...form.field('organisationId', organisations[0]?.id)} />
      <SubmitButton variant="quiet" pendingLabel="Changing…">Go on there</SubmitButton>
    </Form>
  );
}

export function SignOutEverywhereForm({ action }: { action: Action }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Sign out everywhere">
      <p>Signs you out on every phone, tablet and computer, this one included. Do so when a device is lost.</p>
      <SubmitButton variant="quiet" pendingLabel="Signing out…">Sign out everywhere</SubmitButton>
    </Form>
  );
}
