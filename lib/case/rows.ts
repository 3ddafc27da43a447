import type { Baseline } from '@/lib/baseline/baseline-for';
import type { UsedInput } from '@/lib/bench/read-texts';
import type { Judgement } from '@/lib/limits';
import type { Ranking, RecordFacts, Stage, StateShare } from '@/lib/diagnose/types';

/** What a finding that was worked out on the bench was worked out from: its figure can be made again from this alone. */
export interface FindingSum {
  id: string;
  output: string;
  inputs: UsedInput[];
  /** Where the value lies with 95 % probability; null: "never" is within reach on that side. */
  low: number | null;
  high: number | null;
}

/** A finding as it is kept, in the database and on a device. */
export interface FindingRow {
  id: string;
  checkId: string;
  stage: Stage;
  source: string;
  askedBecause: string;
  kind: string;
  shares: StateShare[];
  reliability: number;
  valueTyped: string | null;
  errorTyped: string | null;
  unit: string | null;
  valueSi: number | null;
  errorSi: number | null;
  /** null: not worked out on the bench. */
  sum: FindingSum | null;
  /** By which adopted limit a measured value was judged, and how; null: by none. */
  judgement: Judgement | null;
  /** What it was compared with; null: no baseline counted, or it is nothing that compares. */
  baseline: Baseline | null;
  person: string;
  correctedAt: Date;
  receivedAt: Date;
  late: boolean;
}

export interface NoteRow {
  id: string;
  findingId: string;
  text: string;
  person: string;
  at: Date;
}

/** What of a kept run the views need. */
export interface KeptRun {
  causes: readonly { causeId: string; p: number }[];
}

/** The run that a state shows. `differs`: it doesn't come out the same when made again, or engine and compiled rules disagreed. */
export interface ShownRun {
  id: string;
  ranking: Ranking;
  recordFacts: RecordFacts;
  becauseOf: string | null;
  differs: boolean;
}
