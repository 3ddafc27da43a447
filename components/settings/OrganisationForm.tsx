'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

interface Props {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  organisation: { name: string; country: string; currency: string; labourRatePerHour: number | null };
}

export function OrganisationForm({ action, organisation }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} saved="The organisation is changed.">
      <TextField label="Name" required {...form.field('name', organisation.name)} />
      <TextField
        label="Country"
        hint="Two letters, such as US. It decides the units that people see until they choose their own."
        maxLength={2}
        required
        {...form.field('country', organisation.country)}
      />
      <TextField label="Currency" hint="Three letters, such as USD. Every amount here is in it." maxLength={3} required {...form.field('currency', organisation.currency)} />
      <TextField
        label="An hour of work costs"
        hint="In that currency. The order of repairs weighs minutes by it; left empty, the rulebook's figure is used."
        inputMode="decimal"
        required={false}
        {...form.field('labourRatePerHour', organisation.labourRatePerHour?.toString())}
      />
      <SubmitButton>Save</SubmitButton>
    </Form>
  );
}
