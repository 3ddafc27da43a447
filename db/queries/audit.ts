import { and, count, desc, eq, gte, lt, sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { audit, person } from '@/db/schema';
import { newId } from '@/lib/ids';

type AuditRow = Omit<typeof audit.$inferInsert, 'id'>;

export async function insertAudit(db: Executor, rows: AuditRow[]): Promise<void> {
  if (rows.length > 0) await db.insert(audit).values(rows.map((row) => ({ ...row, id: newId() })));
}

interface Filter {
  organisationId: string;
  personId?: string | null;
  entity?: string | null;
  entityId?: string | null;
  /** From this instant, up to but not including the other. */
  from?: Date | null;
  until?: Date | null;
}

const matching = ({ organisationId, personId, entity, entityId, from, until }: Filter): SQL | undefined =>
  and(
    eq(audit.organisationId, organisationId),
    personId ? eq(audit.personId, personId) : undefined,
    entity ? eq(audit.entity, entity) : undefined,
    entityId ? eq(audit.entityId, entityId) : undefined,
    from ? gte(audit.at, from) : undefined,
    until ? lt(audit.at, until) : undefined,
  );

/** The newest first, with the name of who did it. */
export const listAudit = (db: Executor, { limit, offset, ...filter }: Filter & { limit: number; offset: number }) =>
  db
    .select({
      id: audit.id,
      at: audit.at,
      personId: audit.personId,
      personName: person.name,
      action: audit.action,
      entity: audit.entity,
      entityId: audit.entityId,
      changed: audit.changed,
    })
    .from(audit)
    .leftJoin(person, eq(person.id, audit.personId))
    .where(matching(filter))
    .orderBy(desc(audit.at), desc(audit.id))
    .limit(limit)
    .offset(offset);

export async function countAudit(db: Executor, filter: Filter): Promise<number> {
  const [row] = await db.select({ count: count() }).from(audit).where(matching(filter));
  return row?.count ?? 0;
}

/** The kinds of things that anything was ever noted about. */
export async function listAuditedEntities(db: Executor, { organisationId }: { organisationId: string }): Promise<string[]> {
  const rows = await db.selectDistinct({ entity: audit.entity }).from(audit).where(eq(audit.organisationId, organisationId)).orderBy(sql`1`);
  return rows.map((row) => row.entity);
}
