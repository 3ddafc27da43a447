'use client';

import { useRef, useState } from 'react';
import { Button } from '@/components/ui/Button';
import { FieldError } from '@/components/ui/FieldError';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { TextField } from '@/components/ui/TextField';
import { isPaused, secondsUnderLoad } from '@/lib/break-in';
import type { BreakInRunView } from '@/lib/schemas/break-in';
import type { CaseView } from '@/lib/schemas/case-view';
import { clockText } from './clock-text';
import { Curve, type PressureUnit } from './Curve';
import { useBreakIn, type Noted } from './use-break-in';
import { useNow } from './use-now';

interface Props {
  caseId: string;
  reader: CaseView['reader'];
  run: BreakInRunView;
  unit: PressureUnit;
  /** ms, the server's time when it drew the page. */
  now: number;
  timeZone: string;
  works: boolean;
}

/** The run that goes on: how long it has been under load, what was read, and what to note. */
export function RunUnderWay({ caseId, reader, run, unit, now: atFirst, timeZone, works }: Props) {
  const { events, clock, note, problem } = useBreakIn({ caseId, reader, run, unitSymbol: unit.symbol });
  const now = useNow(atFirst, true);
  const seconds = secondsUnderLoad(clock, now);
  const { least, most } = run.figures.duration;
  const paused = isPaused(clock);
  const standing = paused ? 'It stands still.' : seconds < least ? `${clockText(least - seconds)} to go at least.` : seconds < most ? 'Long enough. It may go on.' : 'The longest time is over: end it.';
  return (
    <div className="grid gap-6">
      <div>
        <p className="figure text-6xl leading-none" role="timer" aria-label={`Under load: ${Math.floor(seconds / 60)} minutes`} data-testid="under-load">{clockText(seconds)}</p>
        <p className="mt-2 text-lg">under load, of {Math.round(least / 60)} to {Math.round(most / 60)} minutes. <strong>{standing}</strong></p>
        <LiveRegion>{paused ? 'It stands still.' : seconds >= least ? 'It has run long enough.' : ''}</LiveRegion>
      </div>
      {works && <Notes paused={paused} unitSymbol={unit.symbol} note={note} problem={problem} />}
      <Curve events={events} clock={clock} figures={run.figures} unit={unit} timeZone={timeZone} />
    </div>
  );
}

/** What is noted as it comes: a pressure, a pause with why, that it goes on. */
function Notes({ paused, unitSymbol, note, problem }: { paused: boolean; unitSymbol: string; note: (noted: Noted) => Promise<boolean>; problem: string | null }) {
  const pressure = useRef<HTMLInputElement>(null);
  const reason = useRef<HTMLInputElement>(null);
  const [missing, setMissing] = useState<'pressure' | 'reason' | null>(null);
  const take = async (field: React.RefObject<HTMLInputElement | null>, what: 'pressure' | 'reason', noted: (text: string) => Noted) => {
    const text = field.current?.value.trim() ?? '';
    setMissing(text ? null : what);
    if (text && (await note(noted(text))) && field.current) field.current.value = '';
  };
  return (
    <div className="grid gap-5 print:hidden">
      <form
        noValidate
        className="flex flex-wrap items-end gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          void take(pressure, 'pressure', (text) => ({ kind: 'reading', pressure: text }));
        }}
      >
        <TextField ref={pressure} label={`Wet tank, ${unitSymbol}`} name="pressure" inputMode="decimal" autoComplete="off" required error={missing === 'pressure' ? 'Enter the pressure that you read.' : undefined} />
        <Button type="submit" className="min-h-14!">Note the pressure</Button>
      </form>
      {paused ? (
        <div><Button className="min-h-14!" onClick={() => void note({ kind: 'resume' })}>It runs again</Button></div>
      ) : (
        <form
          noValidate
          className="flex flex-wrap items-end gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            void take(reason, 'reason', (text) => ({ kind: 'pause', reason: text }));
          }}
        >
          <TextField ref={reason} label="Why it stands still" name="reason" autoComplete="off" required error={missing === 'reason' ? 'Say why it stands still.' : undefined} />
          <Button type="submit" variant="quiet" className="min-h-14!">Pause</Button>
        </form>
      )}
      <FieldError id="break-in-problem" error={problem ?? undefined} />
    </div>
  );
}
