import type { ReactNode } from 'react';
import { FieldError } from './FieldError';
import { hasError, type FieldProps } from './field';
import { classes } from './classes';

export interface Choice {
  value: string;
  label: ReactNode;
  /** A second line under the label. */
  hint?: ReactNode;
  disabled?: boolean;
}

interface Props extends FieldProps {
  choices: readonly Choice[];
  defaultValue?: string;
  required?: boolean;
  /** `cards`: large targets that fill on being picked. `plain`: a column of dots for settings and long forms. */
  look?: 'cards' | 'plain';
  /** How many cards stand side by side from a tablet's width on. */
  columns?: 1 | 2 | 3 | 4;
  className?: string;
}

const across = { 1: '', 2: 'sm:grid-cols-2', 3: 'sm:grid-cols-3', 4: 'sm:grid-cols-4' } as const;

/**
 * One of a few, all in sight: a fieldset whose legend is the question. `id` (the name unless given) is
 * that of the first choice, so that the error summary can put the focus there.
 * @example <RadioGroup label="Where is oil found?" name="place" choices={places} columns={2} error={errors?.place} />
 */
export function RadioGroup({ label, name, id = name, hint, error, choices, defaultValue, required, look = 'cards', columns = 1, className }: Props) {
  const invalid = hasError(error);
  const describedBy = classes(hint != null && `${id}-hint`, invalid && `${id}-error`);
  return (
    <fieldset
      role="radiogroup"
      className={classes('grid min-w-0 gap-2', className)}
      aria-describedby={describedBy || undefined}
      aria-invalid={invalid || undefined}
      aria-required={required}
    >
      <legend className="label mb-2">{label}</legend>
      {hint != null && <p id={`${id}-hint`} className="-mt-2 text-[0.9375rem] text-ink-soft">{hint}</p>}
      <div className={classes('grid gap-2', across[columns])}>
        {choices.map((choice, index) => (
          <label
            key={choice.value}
            className={classes(
              'flex min-h-touch items-center gap-3 has-[:disabled]:text-ink-soft',
              look === 'cards'
                ? 'cursor-pointer rounded border border-edge bg-sheet px-4 py-3 hover:border-ink has-[:checked]:border-ink has-[:checked]:bg-ink has-[:checked]:text-paper has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-ink'
                : 'cursor-pointer py-1.5',
            )}
          >
            <input
              type="radio"
              id={index === 0 ? id : `${id}-${choice.value}`}
              name={name}
              value={choice.value}
              defaultChecked={defaultValue === choice.value}
              disabled={choice.disabled}
              required={required}
              className={classes('size-5 shrink-0', look === 'cards' && 'outline-none')}
            />
            <span>
              <span className={look === 'cards' ? 'text-[1.0625rem] font-bold' : undefined}>{choice.label}</span>
              {choice.hint != null && <span className="block text-[0.9375rem] opacity-85">{choice.hint}</span>}
            </span>
          </label>
        ))}
      </div>
      <FieldError id={`${id}-error`} error={error} />
    </fieldset>
  );
}
