import type { Ranking, RecordFacts, Stage, StateShare } from '@/lib/diagnose/types';

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
