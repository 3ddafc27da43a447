'use client';

import { useRef, useState, type FocusEvent } from 'react';
import { Button } from '@/components/ui/Button';
import { Keypad } from '@/components/ui/Keypad';
import { NumberWithUnitField } from '@/components/ui/NumberWithUnitField';
import { useMedia } from '@/components/ui/use-media';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CheckView } from '@/lib/schemas/case-view';
import { SurenessChoice } from './ChoiceAnswers';
import { Dock } from './Dock';

interface Props {
  check: CheckView;
  pending: boolean;
  /** Messages by field, when what was typed could not be understood. */
  errors: Readonly<Record<string, string>>;
  decimalMark: '.' | ',';
  onAnswer: (answer: AnswerInput) => void;
  onUndo?: () => void;
}

/** A measured value with its unit and the error of the instrument, as people type them or tap them. */
export function MeasuredAnswer({ check, pending, errors, decimalMark, onAnswer, onUndo }: Props) {
  const [sureness, setSureness] = useState<'sure' | 'think-so'>('sure');
  const touch = useMedia('(pointer: coarse)');
  // Undefined until somebody asks: then the pointer decides, in the style sheet, before any script has run.
  const [asked, setAsked] = useState<boolean>();
  const keypad = asked ?? touch;
  const value = useRef<HTMLInputElement>(null);
  const field = useRef<HTMLInputElement>(null);
  const typesInto = (event: FocusEvent<HTMLInputElement>) => {
    field.current = event.currentTarget;
  };
  const own = { onFocus: typesInto, ...(keypad && { inputMode: 'none' as const }) };
  return (
    <form
      method="post"
      className="grid gap-4"
      noValidate
      data-keypad={asked === undefined ? undefined : asked ? 'shown' : 'hidden'}
      onSubmit={(event) => {
        event.preventDefault();
        const form = new FormData(event.currentTarget);
        const text = (name: string) => String(form.get(name) ?? '').trim();
        if (!pending) onAnswer({ kind: 'measured', value: text('value'), error: text('error') || undefined, sureness });
      }}
    >
      <div className="flex flex-wrap gap-x-8 gap-y-3">
        <NumberWithUnitField
          label="You measured"
          name="value"
          unit={check.unitSymbol ?? ''}
          error={errors.value}
          required
          autoFocus={Boolean(errors.value)}
          ref={(input) => {
            value.current = input;
            field.current ??= input;
          }}
          {...own}
        />
        <NumberWithUnitField label="Give or take" name="error" unit={check.errorSymbol ?? ''} error={errors.error} defaultValue={check.usualError ?? ''} required={false} {...own} />
      </div>
      <SurenessChoice name={`sureness-${check.id}`} value={sureness} onChange={setSureness} />
      <Dock onAnswer={onAnswer} onUndo={onUndo}>
        <Keypad field={field} decimalMark={decimalMark} />
        <Button type="submit" className="min-h-14!" aria-disabled={pending || undefined}>{pending ? 'Saving…' : 'Save the value'}</Button>
        <Button
          variant="quiet"
          className="border-transparent!"
          aria-pressed={keypad}
          onClick={() => {
            setAsked(!keypad);
            value.current?.focus();
          }}
        >
          Keypad
        </Button>
      </Dock>
    </form>
  );
}
