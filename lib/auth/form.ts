import { AppError, type FieldErrors } from '@/lib/errors';

/** The text fields of a form; a name that occurs more than once has a list. */
export type FormFields = Record<string, string | string[]>;

/** What was typed, to be put back into the form: React empties it once an action has run. */
export type FormValues = FormFields;

/** State of a form that an action answers; null before the first time. */
export type ActionState<Result = void> =
  | { ok: true; result: Result }
  | { ok: false; message: string; fields: FieldErrors; values: FormValues; reference?: string }
  | null;

/** As much text as any of our forms needs, many times over. */
const MOST_CHARACTERS = 256 * 1024;

/** Never sent back to the page. */
const isSecret = (name: string) => /password|current|token/i.test(name);

/**
 * Reads the text fields of a form. Files and React's own fields are
 * left out.
 *
 * @throws AppError "invalid" when it is no form, "too-large" when it is too long
 */
export function formObject(form: unknown): FormFields {
  if (!(form instanceof FormData)) throw new AppError('invalid', 'This is not what the form sends. Load the page again.');
  const object: FormFields = Object.create(null);
  let length = 0;
  for (const [name, value] of form) {
    if (typeof value !== 'string' || name.startsWith('$ACTION')) continue;
    length += name.length + value.length;
    if (length > MOST_CHARACTERS) throw new AppError('too-large', 'That is more than fits here. Shorten it and send it again.');
    const before = object[name];
    object[name] = before === undefined ? value : [...(Array.isArray(before) ? before : [before]), value];
  }
  return object;
}

export const valuesOf = (object: FormFields): FormValues =>
  Object.fromEntries(Object.entries(object).filter(([name]) => !isSecret(name)));
