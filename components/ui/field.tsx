import type { ReactNode } from 'react';
import { classes } from './classes';
import { FieldError } from './FieldError';

/** One message, or all of them as Zod's flattened errors give them. */
export type FieldErrorText = string | string[] | undefined;

/** What every field takes. `id` is the name unless a page shows the same name twice. */
export interface FieldProps {
  label: ReactNode;
  name: string;
  hint?: ReactNode;
  error?: FieldErrorText;
  id?: string;
}

export const hasError = (error: FieldErrorText): boolean => (Array.isArray(error) ? error.length > 0 : Boolean(error));

/** The attributes that tie a control to its hint and its error. */
export function wiring({ name, id = name, hint, error }: Pick<FieldProps, 'name' | 'id' | 'hint' | 'error'>) {
  const invalid = hasError(error);
  const describedBy = classes(hint != null && `${id}-hint`, invalid && `${id}-error`);
  return {
    id,
    name,
    'aria-describedby': describedBy || undefined,
    'aria-invalid': invalid || undefined,
  } as const;
}

/** Label above, hint under it, then the control, then what is wrong with it. */
export function FieldFrame({ label, name, id = name, hint, error, required, children, className }: FieldProps & { required?: boolean; children: ReactNode; className?: string }) {
  return (
    <div className={classes('field', className)}>
      <div className="field-head">
        <label htmlFor={id} className="label block">
          {label}
          {required === false && <span className="ml-2 font-normal normal-case tracking-normal text-ink-soft">optional</span>}
        </label>
        {hint != null && <p id={`${id}-hint`} className="mt-0.5 text-[0.9375rem] text-ink-soft">{hint}</p>}
      </div>
      {children}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
}
