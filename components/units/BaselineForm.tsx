'use client';

import { useState, type FormEvent } from 'react';
import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm, type FormHandle } from '@/components/forms/use-form';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { TextareaField } from '@/components/ui/TextareaField';
import { FIGURES } from '@/lib/baseline/figures';
import { OCCASIONS } from '@/lib/baseline/set';
import { OCCASION_WORDS } from '@/lib/baseline/words';
import type { UnitPreferences } from '@/lib/units';
import { BaselineStep } from './BaselineStep';

type Result = { id: string; unitId: string };

interface Props {
  action: (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
  /** Of the set, so that what is sent twice is written once. */
  newId: string;
  unitId: string;
  units: UnitPreferences;
  /** Today at the unit's site. */
  today: string;
}

/** The guided set: five figures on one scroll, any of which may be left out. */
export function BaselineForm({ action, newId, unitId, units, today }: Props) {
  const form = useForm(action);
  const occasion = form.field('occasion', 'service');
  return (
    <Form form={form} className="max-w-3xl! gap-8!">
      <input type="hidden" name="id" value={newId} readOnly />
      <input type="hidden" name="unitId" value={unitId} readOnly />
      <div className="grid gap-5">
        <RadioGroup
          label="When it is measured"
          choices={OCCASIONS.map((value) => ({ value, label: OCCASION_WORDS[value] }))}
          columns={2}
          required
          name="occasion"
          error={occasion.error}
          defaultValue={occasion.defaultValue}
        />
        <TextField label="Measured on" type="date" max={today} required {...form.field('measuredOn', today)} />
      </div>
      <Steps form={form} units={units} />
      <TextareaField label="Note" hint="Such as the place where you read the head." required={false} {...form.field('note')} />
      <div>
        <SubmitButton className="min-h-14!">Save the set</SubmitButton>
      </div>
    </Form>
  );
}

const isFilled = (text: FormDataEntryValue | null) => typeof text === 'string' && text.trim() !== '';

function Steps({ form, units }: { form: FormHandle; units: UnitPreferences }) {
  const [measured, setMeasured] = useState<ReadonlySet<string>>(new Set(FIGURES.filter(({ field }) => isFilled(form.field(field).defaultValue)).map(({ field }) => field)));
  const count = (event: FormEvent<HTMLDivElement>) => {
    const { form: own } = event.target as HTMLInputElement;
    if (!own) return;
    const typed = new FormData(own);
    setMeasured(new Set(FIGURES.filter(({ field }) => isFilled(typed.get(field))).map(({ field }) => field)));
  };
  return (
    <div onInput={count}>
      <p role="status" className="heading sticky top-0 z-10 flex min-h-touch items-center justify-between gap-4 border-y border-ink bg-paper py-2 text-lg">
        {measured.size} of {FIGURES.length} measured
        <span aria-hidden="true" className="flex gap-1.5">
          {FIGURES.map(({ field }) => <span key={field} className={`size-4 rounded-full border border-ink ${measured.has(field) ? 'bg-ink' : ''}`} />)}
        </span>
      </p>
      <div className="grid gap-8 pt-6">
        {FIGURES.map((figure, i) => <BaselineStep key={figure.id} figure={figure} number={i + 1} form={form} units={units} />)}
      </div>
    </div>
  );
}
