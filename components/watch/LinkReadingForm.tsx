'use client';

import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { ActionState } from '@/lib/auth/form';
import type { UnitPreferences } from '@/lib/units';
import { ReadingFields } from './ReadingFields';

type Written = ActionState<{ verdict: string }>;

interface Props {
  action: (previous: Written, form: FormData) => Promise<Written>;
  token: string;
  newId: string;
  prompt: string;
  states: readonly { id: string; label: string }[];
  unit: string | null;
  units: UnitPreferences;
}

/** The one reading that a link is for. */
export function LinkReadingForm({ action, token, newId, ...fields }: Props) {
  const form = useForm(action);
  if (form.saved) return <p role="status" className="heading text-xl">Saved. Thank you: you can close this page.</p>;
  return (
    <Form form={form} label="Reading" errorTitle="Not saved yet">
      <input type="hidden" name="token" value={token} readOnly />
      <input type="hidden" name="id" value={newId} readOnly />
      <CheckboxField label="I have read the cautions" required name="hasReadCautions" error={form.errors.hasReadCautions} defaultChecked={form.isTicked('hasReadCautions', 'on', false)} />
      <ReadingFields form={form} prefix="link" {...fields} />
      <TextField label="Your name" autoComplete="name" required {...form.field('name')} />
      <SubmitButton className="min-h-14!" pendingLabel="Saving…">Save the reading</SubmitButton>
    </Form>
  );
}
