import { termLabel, type TermList } from '@/lib/schemas/terms';

/** One field of a form that is opened on a row. */
export interface FormValue {
  /** What the field holds. */
  text: string;
  /** How a person reads it. */
  shown: string;
}

export const plain = (text: string | number | null): FormValue => ({ text: String(text ?? ''), shown: String(text ?? '') });

export const chosen = (list: TermList, key: string | null): FormValue => ({ text: key ?? '', shown: termLabel(list, key) ?? '' });

/** The texts alone, for the form. */
export const textsOf = <Field extends string>(values: Record<Field, FormValue>): Record<Field, string> =>
  Object.fromEntries(Object.entries<FormValue>(values).map(([field, { text }]) => [field, text])) as Record<Field, string>;
