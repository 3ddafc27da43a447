import { z } from 'zod';
import type { StationId } from '@/lib/diagnose/stations';
import { rulebookId } from './case';
import { optionalId, optionalLine, rowId } from './common';
import { optionalDay } from './record';

export const repairPlanInput = z.strictObject({ caseId: rowId });

export const acknowledgeRepairInput = z.strictObject({
  caseId: rowId,
  remedyId: rulebookId,
  cautions: z.array(z.strictObject({ id: rowId, cautionId: rulebookId })).min(1).max(20),
});

/** One remedy at its place in the order. Money is the organisation's currency. */
export interface PlannedRemedyView {
  remedyId: string;
  name: string;
  station: StationId | null;
  /** Causes that it removes and that none before it does. */
  causeIds: string[];
  /** Chance that it is the one. */
  p: number;
  /** The same, given that none before it was. */
  pWhenReached: number;
  lookMinutes: number;
  fixMinutes: number;
  lookCost: number;
  fixCost: number;
  /** What it costs when it was not the one and nobody could see that in the bay; 0: one sees. */
  comebackCost: number;
  parts: { name: string; cost: number }[];
  /** Why it stands at this place, in a sentence. */
  why: string;
  /** It removes what the standing call named. */
  called: boolean;
  cautions: { id: string; text: string }[];
  /** Those that the reader has still to acknowledge today. */
  toRead: string[];
  steps: string[];
  basis: string;
  source: string | null;
}

export interface RepairPlanView {
  caseId: string;
  currency: string;
  labourRatePerHour: number;
  /** The organisation's own, or the rulebook's until it sets one. */
  rateFrom: 'organisation' | 'rulebook';
  remedies: PlannedRemedyView[];
  /** Causes that nothing in the plan removes. */
  left: { causeId: string; name: string; p: number }[];
  /** Of the whole plan, and of leaving everything as it is. */
  expectedCost: number;
  costOfLeaving: number;
  /** How the order was found: the best of all, or a good one. */
  exact: boolean;
}

export const STEP_MARKS = ['done', 'not-done', 'not-applicable'] as const;
export type StepMark = (typeof STEP_MARKS)[number];

/** As pages and documents say it. */
export const STEP_MARK_WORDS: Readonly<Record<StepMark, string>> = { done: 'Done', 'not-done': 'Not done', 'not-applicable': 'Doesn’t apply' };

const ofRepair = { caseId: rowId, repairId: rowId };

export const chooseRepairInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  remedyId: rulebookId,
  /** Asked for when it isn't what the plan has first. */
  whyBefore: optionalLine(500),
  plannedOn: optionalDay,
  assignedTo: optionalId,
});

export const planRepairInput = z.strictObject({ ...ofRepair, plannedOn: optionalDay, assignedTo: optionalId });

export const markStepInput = z.strictObject({
  id: rowId,
  ...ofRepair,
  step: z.coerce.number<string | number>('Say which step.').int().min(0).max(99),
  mark: z.enum(STEP_MARKS, 'Say whether it was done.'),
  value: optionalLine(120),
  note: optionalLine(500),
});

export const endRepairInput = z.strictObject({ ...ofRepair, outcome: z.enum(['done', 'dropped'], 'Say what came of it.'), whyDropped: optionalLine(500) });

/** What was last said of a step. */
export interface StepMarkView {
  mark: StepMark;
  value: string | null;
  note: string | null;
  by: string;
  at: string;
}

/** A remedy that was chosen, with what was done of it. */
export interface RepairView {
  id: string;
  remedyId: string;
  name: string;
  chosenAt: string;
  chosenBy: string;
  whyBefore: string | null;
  plannedOn: string | null;
  assignedTo: string | null;
  assignedToName: string | null;
  endedAt: string | null;
  endedBy: string | null;
  outcome: string | null;
  whyDropped: string | null;
  cautions: { id: string; text: string }[];
  toRead: string[];
  steps: { text: string; mark: StepMarkView | null }[];
  /** Which of the case's repairs it is, in the order of choosing, from 1: the stage of what is seen at it. */
  place: number;
  /** Checks that tell most when something is opened for it. */
  looks: string[];
}
