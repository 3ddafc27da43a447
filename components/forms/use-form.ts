'use client';

import { useActionState, useState } from 'react';
import type { ActionState } from '@/lib/auth/form';

type Action<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

export interface FormHandle<Result = unknown> {
  /** For the form's `action`. */
  submit: (form: FormData) => void;
  /** Counts the answers: what is keyed by it is drawn anew with what was typed. */
  attempt: number;
  saved: boolean;
  /** What the action came to, once it worked. */
  result?: Result;
  message?: string;
  errors: Record<string, string>;
  /** Name, error and what to begin with: what was typed last, or what is stored. */
  field: (name: string, stored?: string | null) => { name: string; error?: string; defaultValue: string };
  /** Whether a box begins ticked. */
  isTicked: (name: string, value: string, stored: boolean) => boolean;
}

/**
 * A form that a server action answers. React empties a form once its action has run, so that every field begins with
 * what was typed (secrets excepted). Works before scripts have loaded.
 *
 * @example
 * const form = useForm(renamePerson);
 * <Form form={form}><TextField label="Name" {...form.field('name', person.name)} /></Form>
 */
export function useForm<Result>(action: Action<Result>): FormHandle<Result> {
  const [state, submit] = useActionState(action, null);
  const [answered, setAnswered] = useState({ state, count: 0 });
  if (answered.state !== state) setAnswered({ state, count: answered.count + 1 });

  const refused = state && !state.ok ? state : undefined;
  return {
    submit,
    attempt: answered.count,
    saved: state?.ok ?? false,
    result: state?.ok ? state.result : undefined,
    message: refused?.message,
    errors: refused?.fields ?? {},
    field(name, stored) {
      const typed = refused?.values[name];
      return { name, error: refused?.fields[name], defaultValue: (Array.isArray(typed) ? typed[0] : typed) ?? stored ?? '' };
    },
    isTicked(name, value, stored) {
      if (!refused) return stored;
      return [refused.values[name] ?? []].flat().includes(value);
    },
  };
}
