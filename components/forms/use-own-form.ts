import { useForm } from './use-form';

/**
 * A form of which a page has several: a field's name is not its id, and its errors lead to its own fields.
 *
 * @param key what tells it from the others of the page
 */
export function useOwnForm<Result>(action: Parameters<typeof useForm<Result>>[0], key: string) {
  const form = useForm(action);
  // What a service takes may lie deeper than the field that it came from: "answer.value".
  const errors = new Map(Object.entries(form.errors).map(([path, text]) => [path.slice(path.lastIndexOf('.') + 1), text]));
  const idOf = (name: string) => `${name}-${key}`;
  return {
    form: { ...form, errors: Object.fromEntries([...errors].map(([name, text]) => [idOf(name), text])) },
    field: (name: string, stored?: string | null) => ({ ...form.field(name, stored), error: errors.get(name), id: idOf(name) }),
  };
}
