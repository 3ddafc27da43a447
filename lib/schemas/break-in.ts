import { z } from 'zod';
import { BREAK_IN_EVENTS, type BreakInEventKind, type BreakInFigures, type HotCheck } from '@/lib/break-in';
import { clockOffsetMs, instant } from './case';
import { optionalLine, rowId } from './common';
import { measureText } from './record';

export const breakInInput = z.strictObject({ caseId: rowId });

/** When it happened by the device's clock, and what to add to that to get ours; without it: now. */
const stamped = { deviceAt: instant.optional(), clockOffsetMs };
const ofRun = { caseId: rowId, runId: rowId };

export const startBreakInInput = z.strictObject({ id: rowId, caseId: rowId, ...stamped });

export const breakInEventInput = z.strictObject({
  id: rowId,
  ...ofRun,
  kind: z.enum(BREAK_IN_EVENTS),
  /** Of a pause. */
  reason: optionalLine(300),
  /** Of a reading, as typed. */
  pressure: measureText,
  ...stamped,
});
export type BreakInEventInput = z.input<typeof breakInEventInput>;

export const endBreakInInput = z.strictObject({ ...ofRun, outcome: z.enum(['done', 'stopped'], 'Say what came of it.'), whyStopped: optionalLine(500), ...stamped });

export const hotCheckInput = z.strictObject({
  ...ofRun,
  oil: z.enum(['none', 'leak'], 'Say whether oil leaks.'),
  coolant: z.enum(['none', 'leak', 'not-applicable'], 'Say whether coolant leaks.'),
  where: optionalLine(300),
});

export interface BreakInEventView {
  id: string;
  kind: BreakInEventKind;
  at: string;
  reason: string | null;
  /** As the reader reads it. */
  pressure: string | null;
  pressurePa: number | null;
  by: string;
}

export interface BreakInRunView {
  id: string;
  figures: BreakInFigures;
  startedAt: string;
  startedBy: string;
  endedAt: string | null;
  endedBy: string | null;
  outcome: string | null;
  whyStopped: string | null;
  hotCheck: HotCheck | null;
  events: BreakInEventView[];
}

export interface BreakInView {
  caseId: string;
  cautions: { id: string; text: string }[];
  /** Those that the reader has still to acknowledge today. */
  toRead: string[];
  /** By which a run begun now goes; null: neither the compressor's model nor the edition gives any. */
  figures: BreakInFigures | null;
  /** The compressor that it is of; null: none is on the unit's record. */
  modelName: string | null;
  /** Inputs of the bench's sum of the bleed, as an address has them. */
  bleed: Record<string, string>;
  runs: BreakInRunView[];
}
