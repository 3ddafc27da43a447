import { index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant, organisationId, organisationPolicy } from './columns';
import { organisation } from './organisation';
import { person } from './person';

/**
 * A mail that goes out for the organisation, written in the transaction that makes it necessary and sent by the worker.
 * Its Message-ID comes from its id, so that every attempt carries the same. Text that holds a secret link is not kept: it
 * is made when the mail is sent, and made again it is the same.
 */
export const mail = pgTable(
  'mail',
  {
    organisationId: organisationId().references(() => organisation.id),
    id: id(),
    /** invitation, and whatever else is posted: decides who makes the text when none is kept */
    kind: text().notNull(),
    /** Null once it is to be forgotten, with the thing that it was about. */
    toAddress: text(),
    subject: text().notNull(),
    body: text(),
    /** What it is about. */
    entity: text().notNull(),
    entityId: text().notNull(),
    /** Who hears when it can't be delivered; null: the administrators. */
    postedBy: uuid().references(() => person.id),
    /** Of an object in the storage, with the name that the reader sees. */
    attachmentKey: text(),
    attachmentName: text(),
    /** waiting; sent: the server has taken it; given-up: it won't be tried again by itself, with why in lastError */
    state: text().notNull().default('waiting'),
    /** Begun, whatever came of them. */
    attempts: integer().notNull().default(0),
    /** In words for an administrator: no stack, nothing of ours. */
    lastError: text(),
    lastTriedAt: instant(),
    sentAt: instant(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.organisationId, t.id] }),
    index('mail_entity').on(t.organisationId, t.entity, t.entityId),
    index('mail_state').on(t.organisationId, t.state, t.createdAt),
    organisationPolicy(),
  ],
).enableRLS();
