import type { PgTable } from 'drizzle-orm/pg-core';
import { adoptedLimit, audit, baselineFigure, baselineSet, call, caseEvent, cases, cautionAcknowledgement, compressorModel, finding, findingNote, fit, notice, oilCatch, run, unit, unitHold, unitReading, watch, watchReading } from '@/db/schema';

/** The tables that the demo fills by the hundred, in an order in which each finds what it refers to. */
export const TABLES = { compressorModel, adoptedLimit, unit, unitReading, fit, baselineSet, baselineFigure, cases, unitHold, oilCatch, caseEvent, finding, findingNote, cautionAcknowledgement, run, call, watch, watchReading, notice, audit };

export type TableName = keyof typeof TABLES;
export type Row<Name extends TableName> = (typeof TABLES)[Name] extends PgTable ? (typeof TABLES)[Name]['$inferInsert'] : never;
export type DemoRows = { [Name in TableName]: Row<Name>[] };

export const noRows = (): DemoRows => ({
  compressorModel: [],
  adoptedLimit: [],
  unit: [],
  unitReading: [],
  fit: [],
  baselineSet: [],
  baselineFigure: [],
  cases: [],
  unitHold: [],
  oilCatch: [],
  caseEvent: [],
  finding: [],
  findingNote: [],
  cautionAcknowledgement: [],
  run: [],
  call: [],
  watch: [],
  watchReading: [],
  notice: [],
  audit: [],
});
