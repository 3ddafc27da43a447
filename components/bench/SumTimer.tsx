'use client';

import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { Stopwatch } from './Stopwatch';

/** Sums with a time that is taken on the vehicle: which input it fills, and when to press. */
const TIMED: Readonly<Record<string, { input: string; start: string; stop: string; marks: readonly string[] }>> = {
  'measured-build-up': { input: 'time', start: 'Start at 85 psi', stop: 'Stop at 100 psi', marks: ['90 psi', '95 psi'] },
  'leak-down': { input: 'time', start: 'Start', stop: 'Stop, and read the gauge', marks: [] },
  'time-loaded': { input: 'loaded', start: 'Start at cut-in', stop: 'Stop at cut-out', marks: [] },
};

interface Props {
  sum: Sum;
  /** Under which the stopwatch is kept. */
  name: string;
  onSeconds: (inputId: string, seconds: number) => void;
}

/** The stopwatch of a sum that takes a time; nothing for any other. */
export function SumTimer({ sum, name, onSeconds }: Props) {
  const timed = TIMED[sum.id];
  if (!timed) return null;
  return <Stopwatch name={name} startLabel={timed.start} stopLabel={timed.stop} marks={timed.marks} onTime={(seconds) => onSeconds(timed.input, seconds)} />;
}
