import type { ComponentProps } from 'react';
import { FieldError } from './FieldError';
import { wiring, type FieldProps } from './field';
import { classes } from './classes';

/**
 * One yes-or-no, the whole line is the target. Sends `value` ("on" unless given) when ticked.
 * @example <CheckboxField label="System cleaned of old oil" name="systemCleaned" defaultChecked={fit.systemCleaned} />
 */
export function CheckboxField({ label, name, id = name, hint, error, className, ...rest }: FieldProps & Omit<ComponentProps<'input'>, keyof FieldProps>) {
  return (
    <div className={classes('grid gap-1', className)}>
      <label htmlFor={id} className="flex min-h-touch cursor-pointer items-center gap-3 py-2">
        <input type="checkbox" className="size-6 shrink-0" {...rest} {...wiring({ name, id, hint, error })} />
        <span>{label}</span>
      </label>
      {hint != null && <p id={`${id}-hint`} className="-mt-2 pl-9 text-[0.9375rem] text-ink-soft">{hint}</p>}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
}
