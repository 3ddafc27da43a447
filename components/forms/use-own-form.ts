import { useForm } from './use-form';

/**
 * A form of which a page has several: a field's name is not its id, and its errors lead to its own fields.
 *
 * @param key what tells it from the others of the page
 */
export function useOwnForm<Result>(action: Parameters<typeof useForm<Result>>[0], key: string) {
  const form = useForm(action);
  const idOf = (name: string) => `${name}-${key}`;
  return {
    form: { ...form, errors: Object.fromEntries(Object.entries(form.errors).map(([name, text]) => [idOf(name), text])) },
    field: (name: string, stored?: string | null) => ({ ...form.field(name, stored), id: idOf(name) }),
  };
}
