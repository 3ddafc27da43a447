import type { ComponentProps } from 'react';
import { FieldFrame, wiring, type FieldProps } from './field';

export interface Option {
  value: string;
  label: string;
  disabled?: boolean;
}
export interface OptionGroup {
  label: string;
  options: readonly Option[];
}

interface Props extends FieldProps {
  options: readonly (Option | OptionGroup)[];
  /** The empty first choice, such as "Any site" or "Pick a model". Left out: the first option is chosen. */
  placeholder?: string;
}

/**
 * One of several, from a list. For two to six choices on a case screen take `RadioGroup`.
 * @example <SelectField label="Site" name="site" placeholder="Any site" options={sites} defaultValue={query.site} />
 */
export function SelectField({ label, name, id, hint, error, required, className, options, placeholder, ...rest }: Props & Omit<ComponentProps<'select'>, keyof Props>) {
  return (
    <FieldFrame {...{ label, name, id, hint, error, required, className }}>
      <select className="control" required={required} {...rest} {...wiring({ name, id, hint, error })}>
        {placeholder !== undefined && <option value="">{placeholder}</option>}
        <Options options={options} />
      </select>
    </FieldFrame>
  );
}

/** The options alone, for a select that another field wraps. */
export function Options({ options }: { options: readonly (Option | OptionGroup)[] }) {
  return options.map((entry) =>
    'options' in entry ? (
      <optgroup key={entry.label} label={entry.label}>
        <Options options={entry.options} />
      </optgroup>
    ) : (
      <option key={entry.value} value={entry.value} disabled={entry.disabled}>
        {entry.label}
      </option>
    ),
  );
}
