import { foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import type { AnswerInput } from '@/lib/schemas/case';
import type { GateReason } from '@/lib/gate/verdict';
import { cases } from './case';
import { createdAt, id, instant, organisationId, organisationPolicy, si } from './columns';
import { edition } from './edition';
import { site } from './organisation';
import { person } from './person';
import { unit } from './unit';

/** The link of a site's parts counter: with it anybody passes the gate, until it runs out or is revoked. It is signed: nothing secret is kept. */
export const gate = pgTable(
  'gate',
  {
    organisationId: organisationId(),
    id: id(),
    siteId: uuid().notNull(),
    /** Where it hangs: "Parts counter". */
    name: text().notNull(),
    /** Whom to ask, as its page says it. */
    askWhom: text().notNull(),
    expiresAt: instant().notNull(),
    revokedAt: instant(),
    revokedBy: uuid().references(() => person.id),
    createdBy: uuid().notNull().references(() => person.id),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    index('gate_site').on(t.organisationId, t.siteId, t.createdAt),
    organisationPolicy(),
  ],
).enableRLS();

/**
 * One asking at a gate whether a unit is to get another compressor. Its id is the page's and the idempotency key. It ends with
 * a verdict, once; the edition and the reasons stay as they were. The fit that it led to is not kept: fits are entered late
 * and corrected, so that it is looked for when it is asked for.
 */
export const gatePassage = pgTable(
  'gate_passage',
  {
    organisationId: organisationId(),
    id: id(),
    gateId: uuid().notNull(),
    siteId: uuid().notNull(),
    unitId: uuid().notNull(),
    /** That of the open case, or the one in force; of the verdict once there is one. */
    editionId: uuid().notNull(),
    complaints: text().array().notNull(),
    /** As whoever asked put it. */
    byName: text().notNull(),
    startedAt: instant().notNull(),
    endedAt: instant(),
    /** fit, not-yet; null: not ended. */
    verdict: text(),
    reasons: jsonb().$type<GateReason[]>(),
    /** Share of the causes that another compressor removes. */
    ofTheCompressor: si(),
    /** The case that it opened or was added to. */
    caseId: uuid(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.gateId], foreignColumns: [gate.organisationId, gate.id] }),
    foreignKey({ columns: [t.organisationId, t.siteId], foreignColumns: [site.organisationId, site.id] }),
    foreignKey({ columns: [t.organisationId, t.unitId], foreignColumns: [unit.organisationId, unit.id] }),
    foreignKey({ columns: [t.organisationId, t.editionId], foreignColumns: [edition.organisationId, edition.id] }),
    foreignKey({ columns: [t.organisationId, t.caseId], foreignColumns: [cases.organisationId, cases.id] }),
    index('gate_passage_unit').on(t.organisationId, t.unitId, t.endedAt),
    index('gate_passage_gate').on(t.organisationId, t.gateId, t.startedAt),
    organisationPolicy(),
  ],
).enableRLS();

/** What was answered in a passage. Never updated; one for each check. */
export const gateAnswer = pgTable(
  'gate_answer',
  {
    organisationId: organisationId(),
    id: id(),
    passageId: uuid().notNull(),
    checkId: text().notNull(),
    /** Counted from 1. */
    place: integer().notNull(),
    answer: jsonb().$type<AnswerInput>().notNull(),
    /** Those that were read before it. */
    cautions: text().array().notNull(),
    /** That the check counts for. */
    minutes: si().notNull(),
    at: instant().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    foreignKey({ columns: [t.organisationId, t.passageId], foreignColumns: [gatePassage.organisationId, gatePassage.id] }),
    unique('gate_answer_check').on(t.organisationId, t.passageId, t.checkId),
    unique('gate_answer_place').on(t.organisationId, t.passageId, t.place),
    organisationPolicy(),
  ],
).enableRLS();
