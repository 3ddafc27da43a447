import type { ComponentProps } from 'react';
import { FieldFrame, wiring, type FieldProps } from './field';

/**
 * One line of text. Say `required={false}` to print "optional" beside the label.
 * @example <TextField label="Fleet number" name="fleetNumber" hint="As painted on the door" error={errors?.fleetNumber} required />
 */
export function TextField({ label, name, id, hint, error, required, className, type = 'text', ...rest }: FieldProps & Omit<ComponentProps<'input'>, keyof FieldProps>) {
  return (
    <FieldFrame {...{ label, name, id, hint, error, required, className }}>
      <input type={type} className="control" required={required} {...rest} {...wiring({ name, id, hint, error })} />
    </FieldFrame>
  );
}
