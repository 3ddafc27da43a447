import { and, asc, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { claim, coreCredit, person } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}

/** What was claimed for a case, oldest first. */
export const selectClaims = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: claim.id,
      toWhom: claim.toWhom,
      theirReference: claim.theirReference,
      sentOn: claim.sentOn,
      amount: claim.amount,
      state: claim.state,
      settledOn: claim.settledOn,
      settledAmount: claim.settledAmount,
      why: claim.why,
      createdBy: person.name,
    })
    .from(claim)
    .innerJoin(person, eq(person.id, claim.createdBy))
    .where(and(eq(claim.organisationId, organisationId), eq(claim.caseId, caseId)))
    .orderBy(asc(claim.sentOn), asc(claim.id));

/** The cores that went back for a case, oldest first. */
export const selectCores = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: coreCredit.id,
      fitId: coreCredit.fitId,
      toWhom: coreCredit.toWhom,
      sentOn: coreCredit.sentOn,
      expectedAmount: coreCredit.expectedAmount,
      state: coreCredit.state,
      settledOn: coreCredit.settledOn,
      creditedAmount: coreCredit.creditedAmount,
      why: coreCredit.why,
      createdBy: person.name,
    })
    .from(coreCredit)
    .innerJoin(person, eq(person.id, coreCredit.createdBy))
    .where(and(eq(coreCredit.organisationId, organisationId), eq(coreCredit.caseId, caseId)))
    .orderBy(asc(coreCredit.sentOn), asc(coreCredit.id));

export async function lockClaim(db: Executor, { organisationId, claimId }: { organisationId: string; claimId: string }) {
  const [row] = await db.select().from(claim).where(and(eq(claim.organisationId, organisationId), eq(claim.id, claimId))).for('update');
  return row;
}

export async function lockCore(db: Executor, { organisationId, coreId }: { organisationId: string; coreId: string }) {
  const [row] = await db.select().from(coreCredit).where(and(eq(coreCredit.organisationId, organisationId), eq(coreCredit.id, coreId))).for('update');
  return row;
}

/** @returns false when one with this id is there already */
export async function insertClaim(db: Executor, row: typeof claim.$inferInsert): Promise<boolean> {
  return (await db.insert(claim).values(row).onConflictDoNothing().returning({ id: claim.id })).length > 0;
}

/** @returns false when one with this id is there already */
export async function insertCore(db: Executor, row: typeof coreCredit.$inferInsert): Promise<boolean> {
  return (await db.insert(coreCredit).values(row).onConflictDoNothing().returning({ id: coreCredit.id })).length > 0;
}

export async function updateClaim(db: Executor, { organisationId, claimId }: { organisationId: string; claimId: string }, change: Partial<typeof claim.$inferInsert>): Promise<void> {
  await db.update(claim).set(change).where(and(eq(claim.organisationId, organisationId), eq(claim.id, claimId)));
}

export async function updateCore(db: Executor, { organisationId, coreId }: { organisationId: string; coreId: string }, change: Partial<typeof coreCredit.$inferInsert>): Promise<void> {
  await db.update(coreCredit).set(change).where(and(eq(coreCredit.organisationId, organisationId), eq(coreCredit.id, coreId)));
}
