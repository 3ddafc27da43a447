'use client';

import { Button } from '@/components/ui/Button';
import { clockFace, isRunning, splits } from '@/lib/stopwatch';
import { useStopwatch } from './use-stopwatch';

interface Props {
  /** Under which it is kept on this device. */
  name: string;
  /** What to press it at: "Start at 85 psi". */
  startLabel: string;
  stopLabel: string;
  /** Pressures to mark on the way: under what each is kept, and what its key says. */
  marks?: readonly { id: string; label: string }[];
  /** The time once it is stopped, in seconds. */
  onTime: (seconds: number) => void;
}

/** A stopwatch for gloves: one large key that starts and stops, and keys for what is passed on the way. */
export function Stopwatch({ name, startLabel, stopLabel, marks = [], onTime }: Props) {
  const { watch, elapsed, start, stop, mark, clear } = useStopwatch(name);
  const running = isRunning(watch);
  const passed = splits(watch);
  const lost = watch.startedAt !== null && elapsed === undefined;
  return (
    <section aria-label="Stopwatch" className="grid max-w-[44rem] gap-3 border-2 border-ink p-4" data-testid="stopwatch">
      <p role="timer" aria-live="off" className="figure text-center text-[3.25rem] leading-none" data-running={running || undefined}>
        {clockFace(elapsed ?? 0)}
      </p>
      {lost && <p className="text-danger">The clock of this device was set back while it ran: nobody knows how long it took. Start again.</p>}
      <Button
        className="min-h-20! text-[1.375rem]!"
        onClick={() => {
          if (!running) return start();
          const ms = stop();
          if (ms !== undefined) onTime(ms / 1000);
        }}
      >
        {running ? stopLabel : watch.startedAt === null ? startLabel : `${startLabel} again`}
      </Button>
      {marks.length > 0 && (
        <div role="group" aria-label="Pressures on the way" className="grid grid-cols-[repeat(auto-fit,minmax(5.5rem,1fr))] gap-2">
          {marks.map(({ id, label }) => {
            const at = passed.find((split) => split.id === id);
            return (
              <Button key={id} variant="quiet" className="min-h-14!" aria-disabled={!running || at !== undefined || undefined} onClick={() => running && !at && mark(id)}>
                <span className="grid">
                  <span>{label}</span>
                  {at && <span className="figure text-[0.9375rem]">{clockFace(at.ms)}</span>}
                </span>
              </Button>
            );
          })}
        </div>
      )}
      {!running && watch.startedAt !== null && <Button variant="quiet" onClick={clear}>Clear</Button>}
    </section>
  );
}
