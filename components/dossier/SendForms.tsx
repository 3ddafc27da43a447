'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useOwnForm } from '@/components/forms/use-own-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextareaField } from '@/components/ui/TextareaField';
import { TextField } from '@/components/ui/TextField';

export type DossierAction<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
export type Sent = { id: string; dossierId: string };
export type Made = { id: string; caseId: string; reference: string };

interface Of {
  caseId: string;
  dossierId: string;
  reference: string;
}

export function SendForm({ action, caseId, dossierId, reference, newId }: Of & { action: DossierAction<Sent>; newId: string }) {
  const { form, field } = useOwnForm(action, dossierId);
  return (
    <Disclosure summary={<>Send it by mail<span className="sr-only">: {reference}</span></>} open={form.message !== undefined}>
      <Form form={form} label={`Send ${reference}`} errorTitle="Not sent yet">
        <Hidden values={{ id: newId, caseId, dossierId }} />
        <TextField label="Email address" type="email" inputMode="email" autoComplete="off" hint="Of the supplier, warranty desk or owner" required {...field('to')} />
        <TextareaField label="What to say with it" rows={4} required={false} {...field('words')} />
        <div>
          <SubmitButton pendingLabel="Posting…">Send {reference}</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

export function AgainForm({ action, label, pendingLabel, values }: { action: DossierAction<Sent> | DossierAction<Made>; label: string; pendingLabel: string; values: Record<string, string> }) {
  const { form } = useOwnForm<Sent | Made>(action as DossierAction<Sent | Made>, Object.values(values).join('-'));
  return (
    <Form form={form} label={label} errorTitle="Not tried again yet">
      <Hidden values={values} />
      <div>
        <SubmitButton variant="quiet" pendingLabel={pendingLabel}>{label}</SubmitButton>
      </div>
    </Form>
  );
}
