'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { ROLE_CHOICES, RolesFieldset } from './RolesFieldset';

type Action<Result = void> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

interface Props {
  action: Action<{ signedOut: boolean }>;
  member: { personId: string; roles: readonly string[]; siteId: string | null; mayRelease: boolean; releaseBasis: string | null };
  sites: readonly Option[];
}

export function MemberForm({ action, member, sites }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} label="Roles and rights">
      <input type="hidden" name="personId" value={member.personId} />
      <RolesFieldset roles={ROLE_CHOICES} error={form.errors.roles} isTicked={(role) => form.isTicked('roles', role, member.roles.includes(role))} />
      <SelectField label="Site" placeholder="Any site" options={sites} required={false} {...form.field('siteId', member.siteId)} />
      <CheckboxField
        label="May release vehicles"
        name="mayRelease"
        hint="Lifts “do not release” from a unit, with the measurement kept."
        error={form.errors.mayRelease}
        defaultChecked={form.isTicked('mayRelease', 'on', member.mayRelease)}
      />
      <TextField
        label="What the right to release rests on"
        hint="A qualification or an appointment, with its date. Needed when the box above is ticked."
        required={false}
        {...form.field('releaseBasis', member.releaseBasis)}
      />
      <p className="text-ink-soft">When roles or the right to release change, the person is signed out on every device.</p>
      <SubmitButton>Save</SubmitButton>
    </Form>
  );
}

export function EndMembershipForm({ action, personId, name }: { action: Action; personId: string; name: string }) {
  const form = useForm(action);
  return (
    <Form form={form} label="End the membership" errorTitle="Not ended">
      <input type="hidden" name="personId" value={personId} />
      <p>{name} is signed out at once and gets no further. Cases go on naming whoever worked on them. An invitation brings somebody back.</p>
      <SubmitButton pendingLabel="Ending…">End the membership</SubmitButton>
    </Form>
  );
}
