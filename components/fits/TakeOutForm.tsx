'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { ReadingFields } from '@/components/units/ReadingFields';
import { termOptions } from '@/lib/schemas/terms';
import type { UnitPreferences } from '@/lib/units';

type Result = { id: string; unitId: string };

interface Props {
  action: (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
  fitId: string;
  version: string;
  today: string;
  units: UnitPreferences;
}

/** When a compressor came off its unit, at what readings, and why. */
export function TakeOutForm({ action, fitId, version, today, units }: Props) {
  const form = useForm(action);
  const why = form.field('whyOut');
  return (
    <Form form={form}>
      <input type="hidden" name="fitId" value={fitId} readOnly />
      <input type="hidden" name="version" value={version} readOnly />
      <TextField label="Came out on" type="date" max={today} required {...form.field('removedOn', today)} />
      <ReadingFields form={form} units={units} names={{ odometer: 'removedOdometer', engineHours: 'removedEngineHours' }} />
      <RadioGroup label="Why it came out" choices={termOptions('whyOut')} required name="whyOut" error={why.error} defaultValue={why.defaultValue} />
      <div>
        <SubmitButton>Take it out</SubmitButton>
      </div>
    </Form>
  );
}
