'use client';

import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { ApiProblem } from '@/lib/query/problem';
import type { RulebookView } from '@/lib/schemas/case-view';
import { lastAsked } from './answered';
import { Cautions, unread } from './Cautions';
import { Undo } from './Dock';
import { Instructions } from './Instructions';
import { PanelAnswers } from './PanelAnswers';
import type { CaseHandle } from './use-case';
import { Minutes } from './Minutes';

interface Props {
  panel: RulebookView['panels'][number];
  rulebook: RulebookView;
  handle: CaseHandle;
  stationName: string;
  onDone: () => void;
}

/** Yes/no checks that are looked at together, as one screen. */
export function PanelAtHand({ panel, rulebook, handle, stationName, onDone }: Props) {
  const { state, answer, acknowledge } = handle;
  const checks = panel.checks.flatMap((id) => rulebook.checks[id] ?? []);
  const careful = checks.find((check) => unread(check, rulebook, state).length > 0) ?? checks.find(({ cautions }) => cautions.length > 0);
  const toRead = careful ? unread(careful, rulebook, state) : [];
  const problem = answer.error instanceof ApiProblem ? answer.error : null;
  const [first] = checks;
  const last = lastAsked(state);
  return (
    <section aria-labelledby="check-at-hand" aria-busy={answer.isPending || undefined} className="grid gap-4">
      <header>
        <p className="label text-ink-soft">{stationName} · {checks.length} checks on one screen</p>
        <h2 id="check-at-hand" tabIndex={-1} className="scroll-mt-12 mt-1 text-[1.75rem]">{panel.prompt}</h2>
        <p className="mt-1 text-ink-soft">
          About <Minutes of={checks.reduce((sum, { minutes }) => sum + minutes, 0)} /> for all of them. Answer those that you can; each is saved as you tap it.
        </p>
      </header>
      {problem && <Notice kind="danger" title="Not saved">{problem.message}</Notice>}
      {careful && (
        <Cautions
          check={careful}
          rulebook={rulebook}
          toRead={toRead}
          pending={acknowledge.isPending}
          onRead={() => acknowledge.mutate({ checkId: careful.id, cautionIds: toRead })}
        />
      )}
      {first && checks.length === 1 && <Instructions check={first} />}
      {toRead.length === 0 && (
        <PanelAnswers
          checks={checks}
          state={state}
          pending={answer.isPending}
          onAnswer={(checkId, given) => answer.mutate({ checkId, answer: given, askedBecause: 'panel' })}
        />
      )}
      <div className="panel-choices">
        <Button className="min-h-14!" onClick={onDone}>Go on to the next check</Button>
        <Undo onUndo={last && (() => answer.mutate({ checkId: last.checkId, answer: { kind: 'undo' }, askedBecause: 'choice' }))} />
      </div>
    </section>
  );
}
