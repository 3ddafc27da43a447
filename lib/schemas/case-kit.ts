import type { Baseline } from '@/lib/baseline/baseline-for';
import type { FindingRow, NoteRow } from '@/lib/case/rows';
import type { Limit } from '@/lib/limits';
import type { RecordFacts, SetUp } from '@/lib/diagnose/types';
import type { DecimalMark, UnitPreferences } from '@/lib/units';
import type { CaseView } from './case-view';

type Dated<Row, Key extends keyof Row> = Omit<Row, Key> & Record<Key, string>;

/**
 * Everything that a device needs to go on with a case when the connection is gone: with the edition's rulebook it gives
 * the same state as the server would.
 */
export interface CaseKit {
  caseId: string;
  editionId: string;
  organisationId: string;
  personId: string;
  version: number;
  status: string;
  vehicleState: SetUp;
  labourRatePerHour: number | null;
  timeZone: string;
  rows: Dated<FindingRow, 'correctedAt' | 'receivedAt'>[];
  notes: Dated<NoteRow, 'at'>[];
  /** What answers are compared with, by the checks that do. A device may still hold a kit from before there were any. */
  baselines?: Record<string, Baseline>;
  run: { id: string; recordFacts: RecordFacts; becauseOf: string | null };
  /** Levels of the run before the shown one. */
  previous: { causeId: string; p: number }[] | null;
  /** What this person read, on which day of the site: it holds for that day. */
  acknowledged: CaseView['state']['acknowledged'];
  acknowledgedOn: string;
  /** That measured values are judged by, by check; a kit that an earlier build kept has none. */
  limits?: Record<string, Limit>;
  person: { name: string; units: UnitPreferences; decimal?: DecimalMark };
}
