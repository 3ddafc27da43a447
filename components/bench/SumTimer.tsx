'use client';

import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { coolingAdvice } from '@/lib/bench/cooling-advice';
import type { Writing } from '@/lib/bench/read-texts';
import { regulationPressure } from '@/lib/bench/regulation-pressure';
import { Stopwatch } from './Stopwatch';

interface Timed {
  /** The input that the time fills. */
  input: string;
  /** When to press; a pressure in psi stands where the regulation names one. */
  start: readonly [string, psi?: number];
  stop: readonly [string, psi?: number];
  /** Passed on the way, psi. */
  marksPsi?: readonly number[];
  /** To be read before the start. */
  advice?: (writing: Writing) => string;
}

/** Sums with a time that is taken on the vehicle. */
const TIMED: Readonly<Record<string, Timed>> = {
  'measured-build-up': { input: 'time', start: ['Start at', 85], stop: ['Stop at', 100], marksPsi: [90, 95] },
  'leak-down': { input: 'time', start: ['Start'], stop: ['Stop, and read the gauge'], advice: coolingAdvice },
  'time-loaded': { input: 'loaded', start: ['Start at cut-in'], stop: ['Stop at cut-out'] },
};

interface Props {
  sum: Sum;
  /** Under which the stopwatch is kept. */
  name: string;
  writing: Writing;
  onSeconds: (inputId: string, seconds: number) => void;
}

/** The stopwatch of a sum that takes a time; nothing for any other. */
export function SumTimer({ sum, name, writing, onSeconds }: Props) {
  const timed = TIMED[sum.id];
  if (!timed) return null;
  const { input, start, stop, marksPsi = [], advice } = timed;
  const said = ([words, psi]: Timed['start']) => (psi === undefined ? words : `${words} ${regulationPressure(psi, writing)}`);
  // Kept by the regulation's own figure, which stays when the person's unit changes.
  const marks = marksPsi.map((psi) => ({ id: `${psi} psi`, label: regulationPressure(psi, writing) }));
  return (
    <div className="grid gap-3">
      {advice && <p className="max-w-prose" data-testid="timer-advice">{advice(writing)}</p>}
      <Stopwatch name={name} startLabel={said(start)} stopLabel={said(stop)} marks={marks} onTime={(seconds) => onSeconds(input, seconds)} />
    </div>
  );
}
