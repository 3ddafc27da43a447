'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { UnitPreferences } from '@/lib/units';
import { ReadingFields } from './ReadingFields';

interface Props {
  action: (previous: ActionState<{ unitId: string }>, form: FormData) => Promise<ActionState<{ unitId: string }>>;
  unitId: string;
  units: UnitPreferences;
  /** Today at the unit's site. */
  today: string;
}

export function ReadingForm({ action, unitId, units, today }: Props) {
  const form = useForm(action);
  return (
    <Form form={form}>
      <input type="hidden" name="unitId" value={unitId} readOnly />
      <TextField label="Read on" type="date" max={today} required {...form.field('readOn', today)} />
      <ReadingFields form={form} units={units} names={{ odometer: 'odometer', engineHours: 'engineHours' }} askReplaced />
      <p className="text-ink-soft">If one was replaced, write down its last reading first: then the distance over both is known exactly.</p>
      <TextField label="Note" required={false} autoComplete="off" {...form.field('note')} />
      <div>
        <SubmitButton>Save the reading</SubmitButton>
      </div>
    </Form>
  );
}
