'use client';

import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useForm } from '@/components/forms/use-form';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { FieldError } from '@/components/ui/FieldError';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { ActionState } from '@/lib/auth/form';

type Passed = ActionState<{ passageId: string }>;
type Action = (previous: Passed, form: FormData) => Promise<Passed>;

/** For gloves: larger than a touch target has to be. */
const BIG = 'min-h-14! w-full justify-self-stretch!';

interface EnterProps {
  action: Action;
  token: string;
  newId: string;
  complaints: readonly { id: string; label: string }[];
}

/** The first step: which unit, what is wrong with it, who asks. */
export function EnterForm({ action, token, newId, complaints }: EnterProps) {
  const form = useForm(action);
  return (
    <Form form={form} label="Unit" errorTitle="Not begun yet">
      <Hidden values={{ token, id: newId }} />
      <TextField label="Unit number" autoComplete="off" autoCapitalize="characters" required {...form.field('fleetNumber')} />
      <fieldset className="grid gap-1" aria-describedby={form.errors.complaints ? 'complaints-error' : undefined}>
        <legend className="label mb-2">Why is a compressor wanted?</legend>
        {complaints.map(({ id, label }, i) => (
          <CheckboxField key={id} label={label} name="complaints" id={i === 0 ? 'complaints' : `complaints-${id}`} value={id} defaultChecked={form.isTicked('complaints', id, false)} />
        ))}
        <FieldError id="complaints-error" error={form.errors.complaints} />
      </fieldset>
      <TextField label="Your name" autoComplete="name" required {...form.field('name')} />
      <SubmitButton className={BIG} pendingLabel="Looking…">Begin the checks</SubmitButton>
    </Form>
  );
}

interface AnswerProps {
  action: Action;
  token: string;
  passageId: string;
  newId: string;
  check: { id: string; prompt: string; cautions: readonly string[]; states: readonly { id: string; label: string }[]; unit: string | null };
}

/** One check: a tap is an answer, saved. */
export function AnswerForm({ action, token, passageId, newId, check }: AnswerProps) {
  const form = useForm(action);
  return (
    <Form form={form} label="Answer" errorTitle="Not saved yet">
      <Hidden values={{ token, id: newId, passageId, checkId: check.id }} />
      {check.cautions.length > 0 && (
        <CheckboxField label="I have read the cautions" required name="hasReadCautions" error={form.errors.hasReadCautions} defaultChecked={form.isTicked('hasReadCautions', 'on', false)} />
      )}
      {check.states.length > 0 ? (
        <fieldset className="grid gap-3">
          <legend className="mb-3 text-lg font-bold">{check.prompt}</legend>
          {check.states.map(({ id, label }) => (
            <SubmitButton key={id} name="state" value={id} className={BIG} pendingLabel={label}>{label}</SubmitButton>
          ))}
          <FieldError id="state-error" error={form.errors.state} />
        </fieldset>
      ) : (
        <>
          <TextField label={check.prompt} hint={check.unit ? `In ${check.unit} unless you write another` : undefined} autoComplete="off" required {...form.field('value')} />
          <SubmitButton className={BIG}>Save and go on</SubmitButton>
        </>
      )}
      <SubmitButton variant="quiet" name="cannotTell" value="on" className={BIG} pendingLabel="Can’t tell">Can’t tell</SubmitButton>
    </Form>
  );
}

/** When nothing is left to ask. */
export function FinishForm({ action, token, passageId }: { action: Action; token: string; passageId: string }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Verdict">
      <Hidden values={{ token, passageId }} />
      <SubmitButton className={BIG} pendingLabel="Working it out…">See the verdict</SubmitButton>
    </Form>
  );
}
