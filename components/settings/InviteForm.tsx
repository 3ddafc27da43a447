'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { ROLE_CHOICES, RolesFieldset } from './RolesFieldset';

interface Props {
  action: (previous: ActionState<{ invitationId: string }>, form: FormData) => Promise<ActionState<{ invitationId: string }>>;
  sites: readonly Option[];
}

export function InviteForm({ action, sites }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} errorTitle="Not invited yet">
      <TextField label="Email address" type="email" autoComplete="off" required {...form.field('email')} />
      <RolesFieldset roles={ROLE_CHOICES} error={form.errors.roles} isTicked={(role) => form.isTicked('roles', role, false)} />
      <SelectField label="Site" placeholder="Any site" options={sites} required={false} {...form.field('siteId')} />
      <SubmitButton pendingLabel="Inviting…">Send the invitation</SubmitButton>
    </Form>
  );
}
