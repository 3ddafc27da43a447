'use client';

import { PhotoStrip } from '@/components/photos/PhotoStrip';
import { ButtonLink } from '@/components/ui/Button';
import { keepFigures } from '@/components/ui/figures';
import { Notice } from '@/components/ui/Notice';
import { ApiProblem } from '@/lib/query/problem';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CaseView, CheckView, RulebookView, SuggestionView } from '@/lib/schemas/case-view';
import { Cautions, unread } from './Cautions';
import { lastAsked } from './answered';
import { ChoiceAnswers } from './ChoiceAnswers';
import { Dock } from './Dock';
import { Instructions } from './Instructions';
import { MeasuredAnswer } from './MeasuredAnswer';
import { sumHref } from './sum-href';
import type { CaseHandle } from './use-case';

interface Props {
  check: CheckView;
  rulebook: RulebookView;
  /** What is usual for the unit, where the check compares with it. */
  usual?: string;
  handle: CaseHandle;
  /** The suggestion that put it here; null when somebody picked it. */
  suggestion: SuggestionView | null;
  stationName: string;
  decimalMark: '.' | ',';
  /** That a value is judged by; undefined: none adopted. */
  limit: CaseView['limits'][string] | undefined;
  catching: CaseView['catching'];
  onAnswered: () => void;
}

/** One check, large: its cautions, how to do it, and its answers; "can't tell" and "skip" are always there. */
export function CheckAtHand({ check, rulebook, usual, limit, handle, suggestion, stationName, decimalMark, catching, onAnswered }: Props) {
  const { state, answer, acknowledge } = handle;
  const problem = answer.error instanceof ApiProblem && answer.variables?.checkId === check.id ? answer.error : null;
  const toRead = unread(check, rulebook, state);
  const then = rulebook.checks[suggestion?.checkIds[1] ?? ''];
  const give = (given: AnswerInput) =>
    answer.mutate(
      { checkId: check.id, answer: given, askedBecause: suggestion ? 'suggested' : 'choice' },
      { onSuccess: onAnswered },
    );

  const last = lastAsked(state);
  const undo = last && (() => answer.mutate({ checkId: last.checkId, answer: { kind: 'undo' }, askedBecause: 'choice' }));
  const isCaughtNow = catching.some(({ checkId }) => checkId === check.id);
  const common = { check, pending: answer.isPending, onAnswer: give, onUndo: undo };

  return (
    <section aria-labelledby="check-at-hand" aria-busy={answer.isPending || undefined} className="grid gap-4">
      <header>
        <p className="label text-ink-soft">
          {stationName} · {suggestion ? suggestion.word : 'your choice'}
        </p>
        <h2 id="check-at-hand" tabIndex={-1} className="scroll-mt-12 mt-1 text-[1.75rem]">{check.prompt}</h2>
        {suggestion?.because && <p className="mt-1">{suggestion.because}</p>}
        {then && <p className="mt-1 text-ink-soft">Then: {then.prompt}</p>}
      </header>
      {problem && (
        <Notice kind="danger" title="Not saved">
          {problem.message} {Object.values(problem.fields).filter((text) => text.includes(' ')).join(' ')}
        </Notice>
      )}
      <SpoilsCatch {...{ check, catching }} />
      <Cautions
        check={check}
        rulebook={rulebook}
        toRead={toRead}
        pending={acknowledge.isPending}
        onRead={() => acknowledge.mutate({ checkId: check.id, cautionIds: toRead })}
      />
      <Instructions check={check} setUpMinutes={suggestion?.setUpMinutes} />
      {limit && <p>Limit your organisation adopted: <strong className="figure">{limit.text}</strong> <span className="text-ink-soft">({limit.source})</span></p>}
      {toRead.length === 0 &&
        (check.kind === 'measured' ? (
          <>
            {usual && <p className="border-l-4 border-ink pl-3">{keepFigures(usual)}.</p>}
            {check.sum && (
              <p className="flex flex-wrap gap-3">
                <ButtonLink variant="quiet" href={sumHref(check.sum, { caseId: state.caseId, checkId: check.id })}>Work it out on the bench</ButtonLink>
                {check.overDays && <ButtonLink variant="quiet" href={`/cases/${state.caseId}/catch`}>{isCaughtNow ? 'Weigh what is caught' : 'Catch it over days'}</ButtonLink>}
              </p>
            )}
            <MeasuredAnswer key={check.id} {...common} errors={problem?.fields ?? {}} decimalMark={decimalMark} />
          </>
        ) : (
          <ChoiceAnswers key={check.id} {...common} />
        ))}
      {toRead.length > 0 && <Dock onAnswer={give} onUndo={undo} />}
      <PhotoStrip checkId={check.id} />
    </section>
  );
}

/** A check that would empty or open what a bottle hangs from: the bottle is weighed first. */
function SpoilsCatch({ check, catching }: Pick<Props, 'check' | 'catching'>) {
  const spoiled = check.spoils.filter(({ id }) => catching.some(({ checkId }) => checkId === id));
  if (spoiled.length === 0) return null;
  return <Notice title="Weigh the bottle first">This spoils what is being caught for “{spoiled.map(({ name }) => name).join('”, “')}”.</Notice>;
}
