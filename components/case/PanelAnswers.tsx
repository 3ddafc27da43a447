'use client';

import { Button } from '@/components/ui/Button';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CaseState, CheckView } from '@/lib/schemas/case-view';

interface Props {
  checks: CheckView[];
  state: CaseState;
  pending: boolean;
  onAnswer: (checkId: string, answer: AnswerInput) => void;
}

/** Several yes/no checks on one screen; each answer saves at once and can be changed by another tap. */
export function PanelAnswers({ checks, state, pending, onAnswer }: Props) {
  return (
    <ul className="grid border-t border-ink">
      {checks.map((check) => {
        const held = state.findings.find((finding) => finding.current && finding.checkId === check.id);
        const chosen = held?.kind === 'state' ? held.shares[0]?.state : held?.kind;
        return (
          <li key={check.id} className="grid gap-2 border-b border-rule py-3 md:grid-cols-[1fr_auto] md:items-center">
            <span id={`panel-${check.id}`} className="text-[1.0625rem]">{check.name}</span>
            <span role="group" aria-labelledby={`panel-${check.id}`} className="panel-choices">
              {check.answers.map(({ id, label }) => (
                <Choice key={id} pressed={chosen === id} pending={pending} onPress={() => onAnswer(check.id, { kind: 'state', state: id, sureness: 'sure' })}>
                  {label}
                </Choice>
              ))}
              <Choice pressed={chosen === 'cannot-tell'} pending={pending} onPress={() => onAnswer(check.id, { kind: 'cannot-tell' })}>
                Can’t tell
              </Choice>
            </span>
          </li>
        );
      })}
    </ul>
  );
}

function Choice({ pressed, pending, onPress, children }: { pressed: boolean; pending: boolean; onPress: () => void; children: React.ReactNode }) {
  return (
    <Button variant={pressed ? 'primary' : 'quiet'} aria-pressed={pressed} aria-disabled={pending || undefined} onClick={() => !pending && !pressed && onPress()}>
      {children}
    </Button>
  );
}
