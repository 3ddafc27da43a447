import type { ComponentProps } from 'react';
import { FieldFrame, wiring, type FieldProps } from './field';

/**
 * Free words over several lines.
 * @example <TextareaField label="In the driver's words" name="words" defaultValue="" />
 */
export function TextareaField({ label, name, id, hint, error, required, className, ...rest }: FieldProps & Omit<ComponentProps<'textarea'>, keyof FieldProps>) {
  return (
    <FieldFrame {...{ label, name, id, hint, error, required, className }}>
      <textarea className="control" required={required} {...rest} {...wiring({ name, id, hint, error })} />
    </FieldFrame>
  );
}
