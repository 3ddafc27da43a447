import { FieldError } from '@/components/ui/FieldError';
import type { SumInput } from '@/lib/air-and-oil/sums/sum';
import { SURVEY_POINTS } from '@/lib/bench/line-survey';
import type { InputText, SumTexts, Writing } from '@/lib/bench/read-texts';
import { symbolOf } from '@/lib/bench/show';

interface Props {
  texts: SumTexts;
  /** Messages by field. */
  errors: Readonly<Record<string, string>>;
  writing: Writing;
  /** What the device's own keyboard is to be; 'none' while the large keys stand for it. */
  inputMode: 'decimal' | 'none';
  onText: (inputId: string, text: InputText) => void;
}

/** A distance and a temperature for each point; what is left empty is not taken. */
export function SurveyFields({ texts, errors, writing, inputMode, onText }: Props) {
  const field = (input: SumInput, word: string) => (
    <div className="grid min-w-0 content-start gap-1">
      <label htmlFor={input.id} className="text-[0.9375rem] text-ink-soft">{word}</label>
      <span className="flex min-w-0 gap-2">
        <input
          type="text"
          autoComplete="off"
          className="control figure min-w-0 flex-1 text-right"
          id={input.id}
          name={input.id}
          inputMode={inputMode}
          value={texts[input.id]?.value ?? ''}
          onChange={({ target }) => onText(input.id, { value: target.value })}
          aria-invalid={errors[input.id] ? true : undefined}
          aria-describedby={[`${input.id}-unit`, errors[input.id] && `${input.id}-error`].filter(Boolean).join(' ')}
        />
        <span id={`${input.id}-unit`} className="figure grid min-w-9 place-items-center border-b-2 border-ink px-1 text-ink-soft">{symbolOf(input, writing)}</span>
      </span>
      <FieldError id={`${input.id}-error`} error={errors[input.id]} />
    </div>
  );
  return SURVEY_POINTS.map(({ number, distance, temperature }) => (
    <fieldset key={number} className="grid max-w-[30rem] grid-cols-2 gap-x-3">
      <legend className="label mb-1">Point {number}</legend>
      {field(distance, 'Distance')}
      {field(temperature, 'Temperature')}
    </fieldset>
  ));
}
