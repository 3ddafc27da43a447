'use client';

import { useActionState, useState } from 'react';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { FieldError } from '@/components/ui/FieldError';
import { FormErrorSummary } from '@/components/ui/FormErrorSummary';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { percent } from '@/components/ui/SightGlass';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextareaField } from '@/components/ui/TextareaField';
import { TextField } from '@/components/ui/TextField';
import type { ActionState } from '@/lib/auth/form';
import { SOMETHING_ELSE } from '@/lib/diagnose/types';
import type { CaseState, RulebookView } from '@/lib/schemas/case-view';
import { useCaseState } from './use-case';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  callId: string;
  initial: CaseState;
  rulebook: RulebookView;
}

export const SURENESS = [
  { value: 'sure', label: 'Sure', hint: 'I have seen it' },
  { value: 'fairly-sure', label: 'Fairly sure', hint: 'All that I found fits' },
  { value: 'guess', label: 'A guess', hint: 'Something has to be tried' },
];

/** Names the cause: one main, others that contributed, how sure, and why when it isn't the one that leads. */
export function CallForm({ action, callId, initial, rulebook }: Props) {
  const [result, submit] = useActionState(action, null);
  const state = useCaseState(initial);
  const failed = result && !result.ok ? result : null;
  const fields = failed?.fields ?? {};
  const text = (name: string) => (typeof failed?.values[name] === 'string' ? failed.values[name] : undefined);
  const leader = state.causes[0]?.causeId ?? '';
  const [main, setMain] = useState<string | null>(text('mainCause') ?? null);
  const chosen = main ?? leader;
  const contributing = new Set([failed?.values.contributingCauses ?? []].flat());
  const nameOf = (causeId: string) => rulebook.causes[causeId]?.name ?? causeId;

  return (
    <form action={submit} className="grid max-w-prose gap-5" noValidate>
      <FormErrorSummary errors={fields} formError={failed?.message} title="Not called yet" />
      <input type="hidden" name="id" value={callId} />
      <input type="hidden" name="caseId" value={state.caseId} />
      <SelectField
        label="The cause"
        name="mainCause"
        value={chosen}
        onChange={(event) => setMain(event.target.value)}
        error={fields.mainCause}
        options={state.causes.map(({ causeId, p }) => ({ value: causeId, label: `${nameOf(causeId)} (${percent(p)})` }))}
      />
      {chosen === SOMETHING_ELSE && <TextField label="What was it?" name="unlistedCause" defaultValue={text('unlistedCause')} error={fields.unlistedCause} required />}
      {chosen !== leader && (
        <TextareaField
          label={`Why this one, when ${nameOf(leader)} leads?`}
          name="whyNotLeading"
          defaultValue={text('whyNotLeading')}
          error={fields.whyNotLeading}
          required
        />
      )}
      <RadioGroup label="How sure are you?" name="sureness" columns={3} choices={SURENESS} defaultValue={text('sureness')} error={fields.sureness} />
      <details className="disclosure">
        <summary className="min-h-touch py-2 font-bold">Did something else contribute?</summary>
        <fieldset aria-describedby={fields.contributingCauses ? 'contributingCauses-error' : undefined}>
          <legend className="sr-only">Contributing causes</legend>
          {state.causes.filter(({ causeId }) => causeId !== chosen).map(({ causeId }, index) => (
            <CheckboxField key={causeId} id={index === 0 ? 'contributingCauses' : `contributing-${causeId}`} label={nameOf(causeId)} name="contributingCauses" value={causeId} defaultChecked={contributing.has(causeId)} />
          ))}
          <FieldError id="contributingCauses-error" error={fields.contributingCauses} />
        </fieldset>
      </details>
      <div><SubmitButton pendingLabel="Calling…">Call the cause</SubmitButton></div>
    </form>
  );
}
