'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { FormSection } from '@/components/units/FormSection';
import { MeasureField } from '@/components/units/MeasureField';
import { termOptions } from '@/lib/schemas/terms';
import type { Quantity, UnitId, UnitPreferences } from '@/lib/units';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  /** Of the limit to be: sent twice it is adopted once. */
  id: string;
  check: { id: string; quantity: Quantity; unit: UnitId };
  values: { least: string; most: string; below: boolean; source: string; country: string; vehicleKind: string; builtFrom: string };
  models: readonly { id: string; name: string }[];
  units: UnitPreferences;
}

export function LimitForm({ action, id, check, values, models, units }: Props) {
  const form = useForm(action);
  const measure = { quantity: check.quantity, like: check.unit };
  return (
    <Form form={form} className="max-w-4xl!">
      <input type="hidden" name="id" value={id} readOnly />
      <input type="hidden" name="checkId" value={check.id} readOnly />
      <FormSection title="The limit" hint="One of both, or both.">
        <MeasureField label="At least" required={false} measure={measure} units={units} {...form.field('least', values.least)} />
        <MeasureField label="At most" required={false} measure={measure} units={units} {...form.field('most', values.most)} />
        <CheckboxField label="The highest value itself is already out: “less than”" name="below" defaultChecked={form.isTicked('below', 'on', values.below)} />
      </FormSection>
      <TextField label="Source" hint="Regulation, maker’s information, your own measurements: where it can be looked up" autoComplete="off" required {...form.field('source', values.source)} />
      <FormSection title="What it is for" hint="Left open, it is for any. Of several that fit a unit the narrower holds.">
        <SelectField label="Compressor model" placeholder="Any model" required={false} options={models.map(({ id: value, name: label }) => ({ value, label }))} {...form.field('modelId')} />
        <TextField label="Country" hint="Two letters, such as US" autoComplete="off" required={false} {...form.field('country', values.country)} />
        <SelectField label="Kind of vehicle" placeholder="Any kind" required={false} options={termOptions('vehicleKind')} {...form.field('vehicleKind', values.vehicleKind)} />
        <TextField label="Built on or after" type="date" required={false} {...form.field('builtFrom', values.builtFrom)} />
        <TextField label="Built before" type="date" required={false} {...form.field('builtBefore')} />
      </FormSection>
      <div>
        <SubmitButton>Adopt the limit</SubmitButton>
      </div>
    </Form>
  );
}
