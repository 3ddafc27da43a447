import type { CompiledRulebook } from '@/lib/diagnose';
import type { Calendar } from './calendar';
import type { DemoRows } from './rows';
import type { TrueCause } from './truth';

/** What every story of the demo is told in, and where its rows go. */
export interface World {
  compiled: CompiledRulebook;
  editionId: string;
  calendar: Calendar;
  rows: DemoRows;
  /** What was really wrong in each case: kept out of the database, for tests to hold the demo against. */
  truths: Map<string, readonly TrueCause[]>;
}
