'use client';

import { FieldError } from '@/components/ui/FieldError';
import type { Sum, SumInput } from '@/lib/air-and-oil/sums/sum';
import { unitsOfInput, type InputText, type SumTexts, type Writing } from '@/lib/bench/read-texts';
import { shown, shownValue, symbolOf } from '@/lib/bench/show';
import { unitDefinition } from '@/lib/units';

interface Props {
  sum: Sum;
  texts: SumTexts;
  /** Messages by field. */
  errors: Readonly<Record<string, string>>;
  /** Where the value of an input comes from, when it wasn't typed: "from the unit's record". */
  known: Readonly<Record<string, string>>;
  writing: Writing;
  /** What the device's own keyboard is to be; 'none' while the large keys stand for it. */
  inputMode: 'decimal' | 'none';
  onText: (inputId: string, text: InputText) => void;
}

/** What a sum takes: each reading with its unit, and beside it how far it can be off. */
export function SumFields({ sum, texts, errors, known, writing, inputMode, onText }: Props) {
  return (
    <div className="grid gap-5">
      {sum.inputs.map((input) => (
        <Reading key={input.id} {...{ input, errors, writing, inputMode }} from={known[input.id]} text={texts[input.id] ?? {}} onText={(text) => onText(input.id, text)} />
      ))}
    </div>
  );
}

interface ReadingProps {
  input: SumInput;
  text: InputText;
  errors: Readonly<Record<string, string>>;
  from?: string;
  writing: Writing;
  inputMode: Props['inputMode'];
  onText: (text: InputText) => void;
}

function Reading({ input, text, errors, from, writing, inputMode, onText }: ReadingProps) {
  const { id, label, note, optional, byDefault, halfWidth } = input;
  const { unit, difference } = unitsOfInput(input, writing.units);
  const symbol = symbolOf(input, writing);
  const usual = shownValue(halfWidth(byDefault), { quantity: difference, like: unit }, writing);
  const hint = [note, optional && `Left empty: ${shown(byDefault, input, writing)}.`, from && `Filled in ${from}.`].filter(Boolean).join(' ');
  const wires = (field: string) => ({ id: field, name: field, 'aria-invalid': errors[field] ? true : undefined });
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="label">
        {label}
        {optional && <span className="ml-2 font-normal normal-case tracking-normal text-ink-soft">optional</span>}
      </label>
      {hint && <p id={`${id}-hint`} className="-mt-1 max-w-prose text-[0.9375rem] text-ink-soft">{hint}</p>}
      <div className="flex flex-wrap items-center gap-x-3 gap-y-2">
        <span className="flex min-w-0 flex-[1_1_9rem] max-w-64 gap-2">
          <input
            type="text"
            inputMode={inputMode}
            autoComplete="off"
            className="control figure min-w-0 flex-1 text-right"
            value={text.value ?? ''}
            onChange={({ target }) => onText({ ...text, value: target.value })}
            {...wires(id)}
            aria-describedby={[hint && `${id}-hint`, `${id}-unit`, errors[id] && `${id}-error`].filter(Boolean).join(' ')}
          />
          <span id={`${id}-unit`} className="figure grid min-w-14 place-items-center border-b-2 border-ink px-2 text-ink-soft">{symbol}</span>
        </span>
        <label className="flex items-center gap-2">
          <span aria-hidden="true" className="figure text-ink-soft">±</span>
          <span className="sr-only">{label}: how far it can be off</span>
          <input
            type="text"
            inputMode={inputMode}
            autoComplete="off"
            className="control figure w-24! text-right"
            placeholder={usual}
            value={text.error ?? ''}
            onChange={({ target }) => onText({ ...text, error: target.value })}
            {...wires(`${id}.error`)}
            aria-describedby={errors[`${id}.error`] ? `${id}.error-error` : undefined}
          />
          <span className="figure text-ink-soft">{unitDefinition(difference, unit as never).symbol}</span>
        </label>
      </div>
      <FieldError id={`${id}-error`} error={errors[id]} />
      <FieldError id={`${id}.error-error`} error={errors[`${id}.error`]} />
    </div>
  );
}
