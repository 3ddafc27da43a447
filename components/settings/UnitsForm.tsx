'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';

interface Props {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  quantities: readonly { quantity: string; label: string; unit: string; units: readonly Option[] }[];
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

export function UnitsForm({ action, quantities }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} saved="Figures are shown in these units from now on.">
      {quantities.map(({ quantity, label, unit, units }) => (
        <SelectField key={quantity} label={capital(label)} options={units} {...form.field(quantity, unit)} />
      ))}
      <SubmitButton>Save the units</SubmitButton>
    </Form>
  );
}
