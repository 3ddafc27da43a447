'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { NumberWithUnitField } from '@/components/ui/NumberWithUnitField';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CheckView } from '@/lib/schemas/case-view';
import { SurenessChoice } from './ChoiceAnswers';

interface Props {
  check: CheckView;
  pending: boolean;
  /** Messages by field, when what was typed could not be understood. */
  errors: Readonly<Record<string, string>>;
  onAnswer: (answer: AnswerInput) => void;
}

/** A measured value with its unit and the error of the instrument, as people type them. */
export function MeasuredAnswer({ check, pending, errors, onAnswer }: Props) {
  const [sureness, setSureness] = useState<'sure' | 'think-so'>('sure');
  return (
    <form
      method="post"
      className="grid gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        const form = new FormData(event.currentTarget);
        const text = (name: string) => String(form.get(name) ?? '').trim();
        if (!pending) onAnswer({ kind: 'measured', value: text('value'), error: text('error') || undefined, sureness });
      }}
    >
      <div className="flex flex-wrap gap-x-8 gap-y-4">
        <NumberWithUnitField label="You measured" name="value" unit={check.unitSymbol ?? ''} error={errors.value} required autoFocus={Boolean(errors.value)} />
        <NumberWithUnitField
          label="Give or take"
          name="error"
          unit={check.errorSymbol ?? ''}
          error={errors.error}
          hint="What the gauge or watch may be off by"
          defaultValue={check.usualError ?? ''}
          required={false}
        />
      </div>
      <SurenessChoice name={`sureness-${check.id}`} value={sureness} onChange={setSureness} />
      <div>
        <Button type="submit" aria-disabled={pending || undefined}>{pending ? 'Saving…' : 'Save the value'}</Button>
      </div>
    </form>
  );
}
