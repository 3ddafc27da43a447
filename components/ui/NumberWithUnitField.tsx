import type { ComponentProps } from 'react';
import { FieldFrame, wiring, type FieldProps } from './field';
import { Options, type Option } from './SelectField';

type Unit =
  /** A unit that can't be changed here: printed beside the figure. */
  | { unit: string; units?: undefined; unitName?: undefined; defaultUnit?: undefined }
  /** A choice of units, sent as `unitName` (`<name>Unit` unless given). */
  | { unit?: undefined; units: readonly Option[]; unitName?: string; defaultUnit?: string };

type Props = FieldProps & Unit;

/**
 * A measured figure and its unit. It is a text input on purpose: people type "8,3 bar" or "5/8", and
 * the parser in `lib/units` reads what they typed; a number input would refuse or drop it.
 * @example <NumberWithUnitField label="Odometer" name="odometer" unit="mi" defaultValue="412 300" />
 * @example <NumberWithUnitField label="Cut-out" name="cutOut" units={[{ value: 'psi', label: 'psi' }, { value: 'kPa', label: 'kPa' }]} defaultUnit="psi" />
 */
export function NumberWithUnitField({ label, name, id = name, hint, error, required, className, unit, units, unitName, defaultUnit, ...rest }: Props & Omit<ComponentProps<'input'>, keyof FieldProps>) {
  const wires = wiring({ name, id, hint, error });
  const unitId = `${id}-unit`;
  return (
    <FieldFrame {...{ label, name, id, hint, error, required, className }}>
      <div className="flex max-w-xs gap-2">
        <input
          type="text"
          inputMode="decimal"
          autoComplete="off"
          className="control figure min-w-0 flex-1 text-right"
          required={required}
          {...rest}
          {...wires}
          aria-describedby={[unit !== undefined && unitId, wires['aria-describedby']].filter(Boolean).join(' ') || undefined}
        />
        {unit !== undefined ? (
          <span id={unitId} className="figure grid min-w-14 place-items-center border-b-2 border-ink px-2 text-ink-soft">{unit}</span>
        ) : (
          <select id={unitId} name={unitName ?? `${name}Unit`} defaultValue={defaultUnit} className="control figure w-28!" aria-label={typeof label === 'string' ? `Unit of ${label}` : 'Unit'}>
            <Options options={units} />
          </select>
        )}
      </div>
    </FieldFrame>
  );
}
