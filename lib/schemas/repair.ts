import { z } from 'zod';
import type { StationId } from '@/lib/diagnose/stations';
import { rulebookId } from './case';
import { rowId } from './common';

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
