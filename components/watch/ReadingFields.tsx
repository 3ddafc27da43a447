import { RadioGroup } from '@/components/ui/RadioGroup';
import { TextField } from '@/components/ui/TextField';
import { MeasureField } from '@/components/units/MeasureField';
import type { FormHandle } from '@/components/forms/use-form';
import { ODOMETER } from '@/lib/schemas/watch';
import type { UnitPreferences } from '@/lib/units';

interface Props {
  form: FormHandle;
  /** The question. */
  prompt: string;
  /** Of a check with answers; none: it is measured. */
  states: readonly { id: string; label: string }[];
  unit: string | null;
  units: UnitPreferences;
  /** Sets the fields of one form apart from those of another on the page. */
  prefix: string;
}

/** What a reading of a watch is entered with, signed in or by a link. */
export function ReadingFields({ form, prompt, states, unit, units, prefix }: Props) {
  return (
    <>
      {states.length > 0 ? (
        <RadioGroup label={prompt} required choices={states.map(({ id, label }) => ({ value: id, label }))} {...form.field('state')} id={`${prefix}-state`} />
      ) : (
        <TextField label={prompt} hint={unit ? `In ${unit} unless you write another` : undefined} autoComplete="off" required {...form.field('value')} id={`${prefix}-value`} />
      )}
      <MeasureField label="Odometer now" required={false} measure={ODOMETER} units={units} {...form.field('odometer')} id={`${prefix}-odometer`} />
      <TextField label="Note" autoComplete="off" required={false} {...form.field('note')} id={`${prefix}-note`} />
    </>
  );
}
