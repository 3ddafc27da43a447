'use client';

import { useState } from 'react';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Button } from '@/components/ui/Button';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { FieldError } from '@/components/ui/FieldError';
import { Notice } from '@/components/ui/Notice';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { ActionState } from '@/lib/auth/form';

interface Made {
  id: string;
  name: string;
  token: string;
  expiresAt: Date;
}

interface Props {
  action: (previous: ActionState<Made>, form: FormData) => Promise<ActionState<Made>>;
  /** What this person can let a token do. */
  scopes: readonly { scope: string; does: string }[];
  /** Choices of how long it works. */
  days: readonly number[];
}

const inWords = (days: number) => (days === 365 ? 'A year' : `${days} days`);

export function MakeTokenForm({ action, scopes, days }: Props) {
  const form = useForm(action);
  return (
    <div className="grid gap-6">
      {form.result && <MadeToken key={form.result.id} name={form.result.name} token={form.result.token} />}
      <Form form={form} label="Make a token" errorTitle="No token made yet">
        <TextField label="Name" hint="What it is for, such as the script that uses it" maxLength={60} required {...form.field('name')} />
        <fieldset className="grid gap-1" aria-describedby={form.errors.scopes ? 'scopes-error' : undefined}>
          <legend className="label mb-1">What it may do</legend>
          {scopes.map(({ scope, does }, index) => (
            <CheckboxField
              key={scope}
              name="scopes"
              id={index === 0 ? 'scopes' : `scopes-${scope}`}
              value={scope}
              defaultChecked={form.isTicked('scopes', scope, false)}
              label={does}
              hint={<span className="figure">{scope}</span>}
            />
          ))}
          <FieldError id="scopes-error" error={form.errors.scopes} />
        </fieldset>
        <SelectField label="Works for" required options={days.map((number) => ({ value: String(number), label: inWords(number) }))} {...form.field('days', '90')} />
        <SubmitButton pendingLabel="Making it…">Make the token</SubmitButton>
      </Form>
    </div>
  );
}

/** The one time that a token is shown. */
function MadeToken({ name, token }: Pick<Made, 'name' | 'token'>) {
  const [said, setSaid] = useState('');
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(token);
      setSaid('Copied.');
    } catch {
      setSaid('This browser does not let it be copied by a button: select it and copy it.');
    }
  };
  return (
    <Notice kind="saved" title={`The token “${name}” is made`} actions={<><Button onClick={copy}>Copy the token</Button><span role="status" className="self-center">{said}</span></>}>
      <p>Copy it now: it is not kept here and can’t be shown again. Whoever has it can do what it may, so keep it like a password.</p>
      <p className="mt-2">
        <code className="figure block rounded border border-edge bg-sunk px-3 py-2 break-all select-all">{token}</code>
      </p>
    </Notice>
  );
}
