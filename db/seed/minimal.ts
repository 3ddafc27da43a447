import { sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connect';
import { membership, organisation, person, site } from '@/db/schema';
import { hashPassword } from '@/lib/auth/password-hash';
import type { Role } from '@/lib/auth/roles';
import type { Rulebook } from '@/lib/diagnose/types';
import { publishFirstEdition, publishUpstream } from './rulebook';
import { seededId } from './seeded-id';
import signIns from './sign-ins.json' with { type: 'json' };

const BEGAN = new Date('2023-01-02T08:00:00Z');

export interface SeededOrganisation {
  organisationId: string;
  siteId: string;
  editionId: string;
  /** The person who signs in for each role. */
  people: Record<Role, string>;
}

/**
 * One organisation with one site, somebody of each role who can sign in, and the rulebook as its edition 1.
 * Runs as the owner; what comes after it in the same transaction sees this organisation's rows.
 */
export async function seedMinimal(tx: Transaction, rulebook: Rulebook): Promise<SeededOrganisation> {
  const organisationId = seededId('organisation');
  const siteId = seededId('site: Quillmere yard');
  const editionId = seededId('edition 1');
  await tx.execute(sql`select set_config('app.organisation_id', ${organisationId}, true)`);

  await tx.insert(organisation).values({
    id: organisationId,
    name: 'Quillmere Freight',
    country: 'US',
    currency: 'USD',
    labourRatePerHour: 140,
    isDemo: true,
    createdAt: BEGAN,
  });
  await tx.insert(site).values({ organisationId, id: siteId, name: 'Quillmere yard', timeZone: 'America/Chicago', createdAt: BEGAN });

  for (const { role, name, email, password } of signIns) {
    const id = seededId(`person: ${role}`);
    await tx.insert(person).values({ id, name, email, passwordHash: await hashPassword(password), createdAt: BEGAN });
    const releases = role === 'engineer' || role === 'manager';
    await tx.insert(membership).values({
      organisationId,
      personId: id,
      roles: [role],
      siteId,
      mayRelease: releases,
      releaseBasis: releases ? 'Named brake inspector of the fleet, renewed each January.' : null,
      createdAt: BEGAN,
    });
  }

  const upstreamNumber = await publishUpstream(tx, rulebook);
  await publishFirstEdition(tx, { organisationId, id: editionId, rulebook, upstreamNumber, at: BEGAN });

  const personOf = (role: Role) => seededId(`person: ${role}`);
  return {
    organisationId,
    siteId,
    editionId,
    people: {
      technician: personOf('technician'),
      engineer: personOf('engineer'),
      manager: personOf('manager'),
      trainer: personOf('trainer'),
      administrator: personOf('administrator'),
    },
  };
}
