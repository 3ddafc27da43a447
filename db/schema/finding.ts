import { boolean, date, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { Baseline } from '@/lib/baseline/baseline-for';
import type { FindingSum } from '@/lib/case/rows';
import type { Judgement } from '@/lib/limits';
import type { Stage, StateShare } from '@/lib/diagnose/types';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { person } from './person';

/**
 * The answer to a check in a case. Never updated: a new answer is a new row. Current is, for each check and stage,
 * the latest by device time corrected for its clock; one that arrives late under a newer answer is kept and isn't
 * current. The id is made on the device and is the idempotency key.
 */
export const finding = pgTable(
  'finding',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    checkId: text().notNull(),
    stage: jsonb().$type<Stage>().notNull(),
    /** asked, record, sum, remedy */
    source: text().notNull(),
    /** suggested, always, random, choice, panel: why it was asked, against feedback when weights are learned */
    askedBecause: text().notNull(),
    /** state, measured, cannot-tell, skip, undo: an undo puts the check back to unanswered */
    kind: text().notNull(),
    /** Empty: can't tell, skipped, undone. */
    shares: jsonb().$type<StateShare[]>().notNull(),
    /** 1 for sure. */
    reliability: si().notNull(),
    valueTyped: text(),
    errorTyped: text(),
    unit: text(),
    valueSi: si(),
    errorSi: si(),
    /** What a sum of the bench made it from; null: it was read or chosen. */
    sum: jsonb().$type<FindingSum>(),
    /** By which adopted limit it was judged, and how; null: by none. */
    judgement: jsonb().$type<Judgement>(),
    /** The healthy baseline that it was compared with when it was given; later sets change nothing of it. null: none. */
    baseline: jsonb().$type<Baseline>(),
    /** Null: somebody without a sign-in, who called himself so. */
    personId: uuid().references(() => person.id),
    byName: text(),
    /** The device's clock, and what to add to it to get the server's. */
    deviceAt: instant().notNull(),
    clockOffsetMs: si().notNull(),
    /** deviceAt corrected: what decides which answer is current. */
    correctedAt: instant().notNull(),
    receivedAt: instant().notNull(),
    /** The finding of the same check and stage that it replaced when it arrived. */
    supersedes: uuid(),
    /** It arrived under a newer answer and was never current. */
    late: boolean().notNull().default(false),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('finding_case').on(t.organisationId, t.caseId, t.checkId, t.correctedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** Words beside a finding. */
export const findingNote = pgTable(
  'finding_note',
  {
    organisationId: organisationId(),
    id: id(),
    findingId: uuid().notNull(),
    caseId: uuid().notNull(),
    text: text().notNull(),
    personId: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.findingId], foreignColumns: [finding.organisationId, finding.id] }),
    index('finding_note_case').on(t.organisationId, t.caseId),
    organisationPolicy(),
  ],
).enableRLS();

/** Who read which caution, on which day of the site and in which danger: asked again when either changes. */
export const cautionAcknowledgement = pgTable(
  'caution_acknowledgement',
  {
    organisationId: organisationId(),
    id: id(),
    caseId: uuid().notNull(),
    cautionId: text().notNull(),
    personId: uuid().notNull().references(() => person.id),
    onDay: date({ mode: 'string' }).notNull(),
    /** engine-running, brakes-released, system-opened: the state that it was read for. */
    dangers: text().array().notNull(),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('caution_acknowledgement_case').on(t.organisationId, t.caseId, t.personId, t.onDay),
    organisationPolicy(),
  ],
).enableRLS();
