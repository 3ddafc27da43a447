import { eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { organisation } from '@/db/schema';

interface Key {
  organisationId: string;
}

export async function findOrganisation(db: Executor, { organisationId }: Key) {
  const [row] = await db
    .select({
      name: organisation.name,
      country: organisation.country,
      currency: organisation.currency,
      labourRatePerHour: organisation.labourRatePerHour,
    })
    .from(organisation)
    .where(eq(organisation.id, organisationId));
  return row;
}

export async function updateOrganisation(
  db: Executor,
  { organisationId }: Key,
  set: { name: string; country: string; currency: string; labourRatePerHour: number | null },
): Promise<void> {
  await db.update(organisation).set(set).where(eq(organisation.id, organisationId));
}
