'use client';

import { useActionState } from 'react';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { FieldError } from '@/components/ui/FieldError';
import { FormErrorSummary } from '@/components/ui/FormErrorSummary';
import { NumberWithUnitField } from '@/components/ui/NumberWithUnitField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextareaField } from '@/components/ui/TextareaField';
import type { ActionState } from '@/lib/auth/form';
import { UnitPicker } from './UnitPicker';

interface Props {
  action: (previous: ActionState<{ id: string; number: number }>, form: FormData) => Promise<ActionState<{ id: string; number: number }>>;
  /** Ids of the rows that this form makes: sent twice, it opens one case. */
  ids: { caseId: string; unitId: string };
  complaints: readonly { id: string; label: string }[];
  sites: readonly { id: string; name: string }[];
  unit: { id: string; fleetNumber: string; siteName: string } | null;
  odometerUnit: string;
}

/** Unit, complaint, odometer: all that it takes to open a case. */
export function OpenCaseForm({ action, ids, complaints, sites, unit, odometerUnit }: Props) {
  const [state, submit] = useActionState(action, null);
  const failed = state && !state.ok ? state : null;
  const fields = failed?.fields ?? {};
  const text = (name: string) => {
    const value = failed?.values[name];
    return typeof value === 'string' ? value : undefined;
  };
  const ticked = new Set([failed?.values.complaints ?? []].flat());
  const odometerRefused = Boolean(fields.odometer || fields.engineHours);

  return (
    <form action={submit} className="grid max-w-3xl gap-8" noValidate>
      <FormErrorSummary errors={fields} formError={failed?.message} title="Not opened yet" />
      <input type="hidden" name="id" value={ids.caseId} />
      <input type="hidden" name="newUnitId" value={ids.unitId} />
      <UnitPicker
        unit={unit}
        sites={sites}
        errors={fields}
        values={{ fleetNumber: text('fleetNumber'), unitId: text('unitId'), siteId: text('siteId'), vehicleKind: text('vehicleKind') }}
      />
      <fieldset aria-describedby={fields.complaints ? 'complaints-error' : undefined}>
        <legend className="label mb-1">What is the complaint?</legend>
        <div className="grid border-t border-rule sm:grid-cols-2 sm:gap-x-8">
          {complaints.map(({ id, label }, index) => (
            <CheckboxField key={id} id={index === 0 ? 'complaints' : `complaint-${id}`} label={label} name="complaints" value={id} defaultChecked={ticked.has(id)} />
          ))}
        </div>
        <FieldError id="complaints-error" error={fields.complaints} />
      </fieldset>
      <TextareaField label="In their words" name="complaintWords" defaultValue={text('complaintWords')} error={fields.complaintWords} required={false} />
      <div className="flex flex-wrap gap-x-8 gap-y-4">
        <NumberWithUnitField label="Odometer" name="odometer" unit={odometerUnit} defaultValue={text('odometer')} error={fields.odometer} required={false} />
        <NumberWithUnitField label="Engine hours" name="engineHours" unit="h" defaultValue={text('engineHours')} error={fields.engineHours} required={false} />
      </div>
      {odometerRefused && <CheckboxField label="The instrument was replaced: record it as a new start" name="odometerReplaced" value="yes" />}
      <div><SubmitButton pendingLabel="Opening…" wide>Open the case</SubmitButton></div>
    </form>
  );
}
