import type { Transaction } from '@/db/connect';
import { membership, organisation, person, site } from '@/db/schema';
import { hashPassword } from '@/lib/auth/password-hash';
import type { Calendar } from './calendar';
import { ORGANISATION, PEOPLE, SITES } from './organisation';

/** The organisation itself: the only rows that differ from one seeding to the next, by the salt of each password. */
export async function writeOrganisation(tx: Transaction, { createdAt, calendar, nextCaseNumber }: { createdAt: Date; calendar: Calendar; nextCaseNumber: number }): Promise<void> {
  const organisationId = ORGANISATION.id;
  await tx.insert(organisation).values({ ...ORGANISATION, nextCaseNumber, isDemo: true, createdAt });
  await tx.insert(site).values(Object.values(SITES).map(({ id, name, timeZone }) => ({ organisationId, id, name, timeZone, createdAt })));
  await tx.insert(person).values(
    await Promise.all(
      PEOPLE.map(async ({ id, name, email, password }) => ({ id, name, email, passwordHash: password ? await hashPassword(password) : null, createdAt })),
    ),
  );
  await tx.insert(membership).values(
    PEOPLE.map(({ id, roles, site: at, releaseBasis, leftOn }) => ({
      organisationId,
      personId: id,
      roles,
      siteId: at ? SITES[at].id : null,
      mayRelease: releaseBasis !== null,
      releaseBasis,
      endedAt: leftOn === undefined ? null : calendar.at(leftOn, 17 * 60, 'UTC'),
      createdAt,
    })),
  );
}
