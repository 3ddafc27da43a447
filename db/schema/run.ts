import { boolean, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { Finding, Ranking, RecordFacts } from '@/lib/diagnose/types';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { edition } from './edition';

/** What a run of record needs to be made again, bit for bit, with its edition. */
export interface RunInputs {
  findings: Finding[];
  recordFacts: RecordFacts;
  beta: number;
  /** Attenuation by evidence group. */
  rho: Record<string, number>;
  /** Limits that the organisation adopted, by check. */
  limits: Record<string, unknown>;
}

/** What it gave; terms are left out, since the inputs give them again. */
export interface RunResult {
  causes: { causeId: string; p: number; scoreNats: number }[];
  fired: string[];
  fit: Ranking['fit'];
}

/** A ranking of record: made by the rule engine at each answer, kept for good. */
export const run = pgTable(
  'run',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    editionId: uuid().notNull(),
    rankerVersion: text().notNull(),
    inputs: jsonb().$type<RunInputs>().notNull(),
    result: jsonb().$type<RunResult>().notNull(),
    /** The finding that made it run; null when the case was opened. */
    becauseOf: uuid(),
    /** The compiled rules fired as the engine did. */
    agreed: boolean().notNull(),
    difference: jsonb(),
    durationMs: si().notNull(),
    at: instant().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    foreignKey({ columns: [t.organisationId, t.editionId], foreignColumns: [edition.organisationId, edition.id] }),
    index('run_case').on(t.organisationId, t.caseId, t.at),
    organisationPolicy(),
  ],
).enableRLS();
