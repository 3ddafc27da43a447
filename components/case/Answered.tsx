'use client';

import { useState } from 'react';
import { Button, ButtonLink } from '@/components/ui/Button';
import { Tag } from '@/components/ui/Tag';
import { keepFigures } from '@/components/ui/figures';
import { TextareaField } from '@/components/ui/TextareaField';
import type { FindingView, RulebookView } from '@/lib/schemas/case-view';
import { lastAsked } from './answered';
import type { Picked } from './at-hand';
import type { CaseHandle } from './use-case';
import { sumHref } from './sum-href';
import { timeText } from './words';

interface Props {
  handle: CaseHandle;
  rulebook: RulebookView;
  timeZone: string;
  /** The case takes no answers: it was called, or the past is shown. */
  readOnly: boolean;
  onPick: (picked: Picked) => void;
}

const SOURCES: Record<string, string> = { record: 'from the record', sum: 'from a sum', remedy: 'seen at the repair' };

/** What was answered, newest first, then what the record knows: each can be changed, taken back, and written about. */
export function Answered({ handle, rulebook, timeZone, readOnly, onPick }: Props) {
  const { state, answer } = handle;
  const current = state.findings.filter((finding) => finding.current && finding.source !== 'record');
  const recorded = state.findings.filter((finding) => finding.current && finding.source === 'record');
  const replaced = state.findings.filter((finding) => !finding.current);
  const last = lastAsked(state);
  return (
    <section aria-labelledby="answered" className="grid gap-3">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 id="answered">Answered so far</h2>
        {last && !readOnly && (
          <Button
            variant="quiet"
            onClick={() => answer.mutate({ checkId: last.checkId, answer: { kind: 'undo' }, askedBecause: 'choice' })}
          >
            Undo the last answer
          </Button>
        )}
      </div>
      <ul className="border-t border-ink">
        {current.map((finding) => (
          <Finding key={finding.id} {...{ finding, handle, rulebook, timeZone, readOnly, onPick }} />
        ))}
      </ul>
      {recorded.length > 0 && (
        <details className="disclosure">
          <summary className="min-h-touch py-2 font-bold">{recorded.length} known from the record of unit, model and fit</summary>
          <ul className="border-t border-rule">
            {recorded.map((finding) => (
              <Finding key={finding.id} {...{ finding, handle, rulebook, timeZone, readOnly, onPick }} />
            ))}
          </ul>
        </details>
      )}
      {replaced.length > 0 && (
        <details className="disclosure">
          <summary className="min-h-touch py-2 font-bold">{replaced.length} earlier {replaced.length === 1 ? 'answer' : 'answers'}</summary>
          <ul className="border-t border-rule">
            {replaced.map((finding) => (
              <li key={finding.id} className="border-b border-rule py-2">
                {rulebook.checks[finding.checkId]?.name}: <s>{finding.answer}</s>{' '}
                <span className="text-ink-soft">
                  {finding.late ? 'came late, under a newer answer; ' : ''}{finding.person}, {timeText(finding.at, timeZone)}
                </span>
              </li>
            ))}
          </ul>
        </details>
      )}
    </section>
  );
}

function Finding({ finding, handle, rulebook, timeZone, readOnly, onPick }: Props & { finding: FindingView }) {
  const check = rulebook.checks[finding.checkId];
  return (
    <li data-finding={finding.id} data-waits={finding.waits || undefined} className="grid gap-x-4 border-b border-rule py-1.5 sm:grid-cols-[minmax(0,1fr)_auto]">
      <div className="py-1">
        <p>
          {check?.name ?? finding.checkId}: <strong className={finding.kind === 'measured' ? 'figure' : undefined}>{finding.answer}</strong>
          {finding.thinkSo && ' (think so)'} {finding.waits && <Tag>waits on this device</Tag>}
        </p>
        {finding.judgement && (
          <p className={finding.judgement.verdict === 'out' ? 'text-[0.9375rem] font-bold' : 'text-[0.9375rem]'}>{finding.judgement.text}.</p>
        )}
        {finding.compared && <p>{keepFigures(sentence(finding.compared))}</p>}
        <p className="text-[0.9375rem] text-ink-soft">
          {SOURCES[finding.source] ? `${SOURCES[finding.source]}, ` : ''}{finding.person}, {timeText(finding.at, timeZone)}
        </p>
      </div>
      <div className="flex flex-wrap items-center gap-x-2 has-[form]:order-last has-[form]:col-span-full">
        {finding.sum && (
          <ButtonLink variant="quiet" className="border-transparent! px-3!" href={sumHref(finding.sum.id, { caseId: handle.state.caseId, checkId: finding.checkId }, finding.sum.search)}>
            The sum<span className="sr-only"> behind {check?.name}</span>
          </ButtonLink>
        )}
        {!readOnly && (
          <Button variant="quiet" className="border-transparent! px-3!" onClick={() => onPick({ kind: 'check', checkId: finding.checkId })}>
            Change<span className="sr-only">: {check?.name}</span>
          </Button>
        )}
        {handle.state.at === null && <NoteForm finding={finding} handle={handle} about={check?.name ?? ''} />}
      </div>
      {finding.notes.length > 0 && (
        <ul className="col-span-full mb-1 grid gap-1">
          {finding.notes.map((note) => (
            <li key={note.id} className="border-l-4 border-rule pl-3">
              {note.text} <span className="text-[0.9375rem] text-ink-soft">{note.person}</span> {note.waits && <Tag>waits on this device</Tag>}
            </li>
          ))}
        </ul>
      )}
    </li>
  );
}

const sentence = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;

function NoteForm({ finding, handle, about }: { finding: FindingView; handle: CaseHandle; about: string }) {
  const [open, setOpen] = useState(false);
  const { note } = handle;
  if (!open) {
    return (
      <Button variant="quiet" className="border-transparent! px-3!" onClick={() => setOpen(true)}>
        Add a note<span className="sr-only">: {about}</span>
      </Button>
    );
  }
  return (
    <form
      method="post"
      className="grid w-full gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        const text = String(new FormData(event.currentTarget).get('text') ?? '').trim();
        if (text) note.mutate({ findingId: finding.id, text }, { onSuccess: () => setOpen(false) });
      }}
    >
      <TextareaField label="Note" name="text" id={`note-${finding.id}`} error={note.error?.message} autoFocus />
      <div className="flex gap-3">
        <Button type="submit">{note.isPending ? 'Saving…' : 'Save the note'}</Button>
        <Button variant="quiet" onClick={() => setOpen(false)}>Cancel</Button>
      </div>
    </form>
  );
}
