'use client';

import type { ActionState } from '@/lib/auth/form';
import { useForm } from './use-form';

/** A form of which a page has several: a field's name is not its id, and its errors lead to its own fields. */
export function useOwnForm<Result>(action: (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>, key: string) {
  const form = useForm(action);
  // What a service takes may lie deeper than the field that it came from: "answer.value".
  const errors = new Map(Object.entries(form.errors).map(([path, text]) => [path.slice(path.lastIndexOf('.') + 1), text]));
  const idOf = (name: string) => `${name}-${key}`;
  return {
    form: { ...form, errors: Object.fromEntries([...errors].map(([name, text]) => [idOf(name), text])) },
    field: (name: string, stored?: string | null) => ({ ...form.field(name, stored), error: errors.get(name), id: idOf(name) }),
  };
}

/** What goes with a form unseen. */
export const Hidden = ({ values }: { values: Readonly<Record<string, string>> }) => Object.entries(values).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} readOnly />);
