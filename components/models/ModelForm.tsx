'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { TextareaField } from '@/components/ui/TextareaField';
import { FormSection } from '@/components/units/FormSection';
import { MeasureField } from '@/components/units/MeasureField';
import { termOptions } from '@/lib/schemas/terms';
import type { UnitPreferences } from '@/lib/units';
import { BREAK_IN_FIELDS, MODEL_MEASURE_FIELDS } from './model-measures';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  units: UnitPreferences;
  stored: Record<string, string>;
  /** A new model gets this id; one that exists is changed from this version. */
  model: { newId: string } | { modelId: string; version: string };
}

const NOT_RECORDED = 'Not recorded';

export function ModelForm({ action, units, stored, model }: Props) {
  const form = useForm(action);
  const field = (name: string) => form.field(name, stored[name]);
  return (
    <Form form={form} className="max-w-4xl!">
      {'newId' in model ? (
        <input type="hidden" name="id" value={model.newId} readOnly />
      ) : (
        <>
          <input type="hidden" name="modelId" value={model.modelId} readOnly />
          <input type="hidden" name="version" value={model.version} readOnly />
        </>
      )}
      <TextField label="Name" hint="As your workshop calls it" autoComplete="off" required className="max-w-md" {...field('name')} />
      <FormSection title="What a case need not ask" hint="Whatever is recorded here is never asked in the bay.">
        <SelectField label="Oil drain" hint="How oil falls back to the engine" placeholder={NOT_RECORDED} options={termOptions('drainOpening')} {...field('drainOpening')} />
        <SelectField label="Oil feed" hint="Where engine oil enters" placeholder={NOT_RECORDED} options={termOptions('oilFeedPlace')} {...field('oilFeedPlace')} />
        <SelectField label="Breathes from" placeholder={NOT_RECORDED} options={termOptions('intakeType')} {...field('intakeType')} />
        <SelectField label="Head cooled by" placeholder={NOT_RECORDED} options={termOptions('cooling')} {...field('cooling')} />
        <SelectField label="Drive gear of" placeholder={NOT_RECORDED} options={termOptions('driveGear')} {...field('driveGear')} />
        <SelectField label="Unloads by" placeholder={NOT_RECORDED} options={termOptions('unloading')} {...field('unloading')} />
      </FormSection>
      <FormSection title="Sizes">
        {MODEL_MEASURE_FIELDS.map(({ measure, label, hint }) => (
          <MeasureField key={measure.field} label={label} hint={hint} required={false} units={units} measure={measure} {...field(measure.field)} />
        ))}
        <TextField label="Cylinders" inputMode="numeric" required={false} {...field('cylinders')} />
      </FormSection>
      <FormSection title="Break-in run" hint="Only where its maker says otherwise than the rulebook. What is left open stays as the rulebook has it.">
        <TextField label="Engine speed" hint="Revolutions a minute" inputMode="numeric" required={false} {...field('breakInEngineRpm')} />
        {BREAK_IN_FIELDS.map(({ measure, label, hint }) => (
          <MeasureField key={measure.field} label={label} hint={hint} required={false} units={units} measure={measure} {...field(measure.field)} />
        ))}
        <TextField label="Where this is from" autoComplete="off" required={false} {...field('breakInSource')} />
      </FormSection>
      <TextareaField label="Note" required={false} {...field('note')} />
      <div>
        <SubmitButton>{'newId' in model ? 'Add the model' : 'Save the model'}</SubmitButton>
      </div>
    </Form>
  );
}
