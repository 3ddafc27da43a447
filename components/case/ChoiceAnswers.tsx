'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CheckView } from '@/lib/schemas/case-view';
import { Dock } from './Dock';

type Sureness = 'sure' | 'think-so';

interface Props {
  check: CheckView;
  pending: boolean;
  onAnswer: (answer: AnswerInput) => void;
  onUndo?: () => void;
}

/** As many answers as leave a phone room to read above them. */
const FEW = 4;

/** The answers of a check, each a large button that saves at once. */
export function ChoiceAnswers({ check, pending, onAnswer, onUndo }: Props) {
  const [sureness, setSureness] = useState<Sureness>('sure');
  const [tapped, setTapped] = useState<string | null>(null);
  return (
    <div className="grid gap-4">
      <SurenessChoice name={`sureness-${check.id}`} value={sureness} onChange={setSureness} />
      <Dock short={check.answers.length <= FEW} onAnswer={onAnswer} onUndo={onUndo}>
        <div role="group" aria-label={`Answers: ${check.prompt}`} className="answers">
          {check.answers.map(({ id, label }) => (
            <Button
              key={id}
              className="answer"
              aria-disabled={pending || undefined}
              data-tapped={(pending && tapped === id) || undefined}
              onClick={() => {
                if (pending) return;
                setTapped(id);
                onAnswer({ kind: 'state', state: id, sureness });
              }}
            >
              {label}
            </Button>
          ))}
        </div>
      </Dock>
    </div>
  );
}

/** Sure, or only think so: said before the answer, since the answer is saved as it is tapped. */
export function SurenessChoice({ name, value, onChange }: { name: string; value: Sureness; onChange: (value: Sureness) => void }) {
  return (
    <fieldset className="flex flex-wrap items-center gap-x-6">
      <legend className="sr-only">How sure are you?</legend>
      {(['sure', 'think-so'] as const).map((choice) => (
        <label key={choice} className="flex min-h-touch cursor-pointer items-center gap-2">
          <input type="radio" className="size-6" name={name} checked={value === choice} onChange={() => onChange(choice)} />
          {choice === 'sure' ? 'Sure' : 'I think so'}
        </label>
      ))}
    </fieldset>
  );
}
