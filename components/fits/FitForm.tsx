'use client';

import type { ReactNode } from 'react';
import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm, type FormHandle } from '@/components/forms/use-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { TextareaField } from '@/components/ui/TextareaField';
import { FormSection } from '@/components/units/FormSection';
import { ReadingFields } from '@/components/units/ReadingFields';
import { dayText } from '@/lib/schemas/day-text';
import { PARTS_WITH_IT } from '@/lib/schemas/fit';
import { termOptions } from '@/lib/schemas/terms';
import type { UnitPreferences } from '@/lib/units';

type Result = { id: string; unitId: string };

interface Props {
  action: (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
  models: readonly { id: string; name: string }[];
  units: UnitPreferences;
  /** Today at the unit's site. */
  today: string;
  stored: Record<string, string>;
  fit: { newId: string; unitId: string; standing: { modelName: string; installedOn: string } | null } | { fitId: string; version: string };
}

/** The record doesn't say. That somebody said “nobody knows” is an answer of its own where it can be given. */
const NOT_RECORDED = 'Not recorded';

const OUT = ['removedOn', 'whyOut', 'removedOdometer', 'removedEngineHours'];

/** A compressor on a unit: which, when, how it was fitted, and how it came out if it has. */
export function FitForm({ action, models, units, today, stored, fit }: Props) {
  const form = useForm(action);
  const field = (name: string) => form.field(name, stored[name]);
  const condition = field('condition');
  const isNew = 'newId' in fit;
  const out = (
    <div className="form-grid">
      <TextField label="Came out on" type="date" max={today} required={false} {...field('removedOn')} />
      <SelectField label="Why it came out" placeholder="It hasn’t" required={false} options={termOptions('whyOut')} {...field('whyOut')} />
      <ReadingFields form={form} units={units} names={{ odometer: 'removedOdometer', engineHours: 'removedEngineHours' }} stored={stored} />
    </div>
  );
  return (
    <Form form={form} className="max-w-4xl!">
      {isNew ? (
        <>
          <input type="hidden" name="id" value={fit.newId} readOnly />
          <input type="hidden" name="unitId" value={fit.unitId} readOnly />
        </>
      ) : (
        <>
          <input type="hidden" name="fitId" value={fit.fitId} readOnly />
          <input type="hidden" name="version" value={fit.version} readOnly />
        </>
      )}
      {isNew && fit.standing && (
        <FormSection title="The one that comes out" hint={`The ${fit.standing.modelName} has been on the unit since ${dayText(fit.standing.installedOn)}. It comes out on the day, and at the readings, at which this one goes on.`}>
          <SelectField label="Why it comes out" placeholder="Choose why" options={termOptions('whyOut')} {...field('previousWhyOut')} />
        </FormSection>
      )}
      <FormSection title="The compressor">
        <SelectField label="Model" placeholder="Choose a model" required options={models.map(({ id, name }) => ({ value: id, label: name }))} {...field('modelId')} />
        <RadioGroup label="New or rebuilt" choices={termOptions('condition')} columns={2} required name="condition" error={condition.error} defaultValue={condition.defaultValue} />
        <TextField label="Fitted on" type="date" max={today} required {...field('installedOn')} />
        <ReadingFields form={form} units={units} names={{ odometer: 'installedOdometer', engineHours: 'installedEngineHours' }} stored={stored} />
      </FormSection>
      <HowItWasFitted field={field} />
      <Folded folded={isNew} open={OUT.some((name) => field(name).error !== undefined || field(name).defaultValue !== '')} title={isNew ? 'It has come out already' : 'How it came out'}>
        {out}
      </Folded>
      <TextareaField label="Note" required={false} {...field('note')} />
      <div>
        <SubmitButton>{isNew ? 'Record the fit' : 'Save the fit'}</SubmitButton>
      </div>
    </Form>
  );
}

function HowItWasFitted({ field }: { field: (name: string) => ReturnType<FormHandle['field']> }) {
  return (
    <FormSection title="How it was fitted" hint="Leave open what you can’t say: a case asks for it only then.">
      <SelectField label="Sealant at the gasket" placeholder={NOT_RECORDED} options={termOptions('sealant')} {...field('sealant')} />
      {PARTS_WITH_IT.map(({ field: name, label }) => (
        <SelectField key={name} label={label} placeholder={NOT_RECORDED} options={termOptions('withIt')} {...field(name)} />
      ))}
      <SelectField label="Old oil cleaned out" hint="Of line, dryer and tanks" placeholder={NOT_RECORDED} options={termOptions('yesNo')} {...field('systemCleaned')} />
      <SelectField label="Break-in run" hint="Run in under steady load" placeholder={NOT_RECORDED} options={termOptions('yesNo')} {...field('breakInRun')} />
    </FormSection>
  );
}

function Folded({ folded, open, title, children }: { folded: boolean; open: boolean; title: string; children: ReactNode }) {
  if (folded) return <Disclosure summary={title} open={open}>{children}</Disclosure>;
  return (
    <fieldset className="grid min-w-0 gap-5 border-t border-ink pt-4">
      <legend className="heading float-left mb-1 w-full text-xl">{title}</legend>
      {children}
    </fieldset>
  );
}
