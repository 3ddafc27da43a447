import { and, asc, desc, eq, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { attachment, person, removal } from '@/db/schema';

interface Of {
  organisationId: string;
  photoId: string;
}

const thisPhoto = ({ organisationId, photoId }: Of) => and(eq(attachment.organisationId, organisationId), eq(attachment.id, photoId));

const STORED = {
  id: attachment.id,
  caseId: attachment.caseId,
  checkId: attachment.checkId,
  objectKey: attachment.objectKey,
  mediaType: attachment.mediaType,
  bytes: attachment.bytes,
  state: attachment.state,
  refusal: attachment.refusal,
  thumbnailKey: attachment.thumbnailKey,
  description: attachment.description,
  strokes: attachment.strokes,
};

export type AttachmentRow = NonNullable<Awaited<ReturnType<typeof selectAttachment>>>;

/** @returns false when a photo with this id is there already: the same request came twice. */
export async function insertAttachment(db: Executor, row: typeof attachment.$inferInsert): Promise<boolean> {
  const inserted = await db.insert(attachment).values(row).onConflictDoNothing().returning({ id: attachment.id });
  return inserted.length > 0;
}

export async function selectAttachment(db: Executor, of: Of) {
  const [row] = await db.select(STORED).from(attachment).where(thisPhoto(of));
  return row;
}

/** The same, and nobody else writes to it until this transaction ends. */
export async function lockAttachment(db: Executor, of: Of) {
  const [row] = await db.select(STORED).from(attachment).where(thisPhoto(of)).for('update');
  return row;
}

type Changeable = 'state' | 'refusal' | 'mediaType' | 'bytes' | 'width' | 'height' | 'thumbnailKey' | 'description' | 'strokes';

export async function updateAttachment(db: Executor, of: Of, change: Partial<Pick<typeof attachment.$inferInsert, Changeable>>): Promise<void> {
  await db.update(attachment).set(change).where(thisPhoto(of));
}

/** The stored photos of a case, hidden ones included, in the order in which they were taken. */
export async function selectStoredOfCase(db: Executor, { organisationId, caseId, limit }: { organisationId: string; caseId: string; limit: number }) {
  return db
    .select({
      id: attachment.id,
      caseId: attachment.caseId,
      checkId: attachment.checkId,
      place: attachment.place,
      width: attachment.width,
      height: attachment.height,
      takenAt: attachment.takenAt,
      createdAt: attachment.createdAt,
      person: person.name,
      description: attachment.description,
      strokes: attachment.strokes,
    })
    .from(attachment)
    .innerJoin(person, eq(person.id, attachment.personId))
    .where(and(eq(attachment.organisationId, organisationId), eq(attachment.caseId, caseId), eq(attachment.state, 'stored')))
    .orderBy(asc(sql`coalesce(${attachment.takenAt}, ${attachment.createdAt})`), asc(attachment.id))
    .limit(limit);
}

/** The last that was said about hiding each photo of a case. */
export async function selectRemovalsOfCase(db: Executor, { organisationId, caseId }: { organisationId: string; caseId: string }) {
  return db
    .selectDistinctOn([removal.entityId], { photoId: removal.entityId, kind: removal.kind, reason: removal.reason, person: person.name, at: removal.at })
    .from(removal)
    .innerJoin(attachment, and(eq(attachment.organisationId, removal.organisationId), eq(attachment.id, removal.entityId)))
    .innerJoin(person, eq(person.id, removal.personId))
    .where(and(eq(removal.organisationId, organisationId), eq(removal.entity, 'photo'), eq(attachment.caseId, caseId)))
    .orderBy(removal.entityId, desc(removal.at), desc(removal.id));
}
