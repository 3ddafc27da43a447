import { randomUUID } from 'node:crypto';
import { asTenant } from '@/db/connect';
import { membership, organisation, person, site } from '@/db/schema';
import { publishFirstEdition, publishUpstream } from '@/db/seed/rulebook';
import { hashPassword } from '@/lib/auth/password-hash';
import type { Role } from '@/lib/auth/roles';
import type { Rulebook } from '@/lib/diagnose/types';
import { newId } from '@/lib/ids';
import { jobs } from '@/lib/jobs';
import type { Ctx, Visitor } from '@/lib/services/context';
import type { Storage } from '@/lib/storage';
import { noStorage } from '@/lib/storage/none';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';
import type { TestDatabases } from './context';

interface PersonOptions {
  roles?: readonly Role[];
  mayRelease?: boolean;
  /** Given: the person can sign in with it. Hashing takes 40 ms. */
  password?: string;
  email?: string;
}

interface TenantOptions extends PersonOptions {
  country?: string;
  timeZone?: string;
  now?: () => Date;
  /** Given where photos are at stake. */
  storage?: Storage;
  /** Given: it becomes the organisation's edition 1, and upstream's when there is none like it. */
  rulebook?: Rulebook;
}

export interface Tenant {
  ctx: Ctx;
  organisationId: string;
  siteId: string;
  /** Of the edition made from `rulebook`. */
  editionId: string;
  personId: string;
  /** A colleague, as a context of his own. */
  addPerson(options?: PersonOptions): Promise<Ctx>;
  /** Runs as the owner with this organisation set, past the services. */
  asOwner: <T>(work: Parameters<typeof asTenant<T>>[2]) => Promise<T>;
}

/**
 * An organisation of a test's own with a site and one person (a technician unless told otherwise), and the context
 * that services take. Tests share nothing, so that they may run in any order.
 *
 * @example
 * const { ctx } = await makeTenant(databases, { roles: ['manager'] });
 */
export async function makeTenant(databases: TestDatabases, options: TenantOptions = {}): Promise<Tenant> {
  const { country = 'US', timeZone = 'America/Chicago', now = () => new Date(), storage = noStorage, rulebook } = options;
  const organisationId = newId();
  const siteId = newId();
  const editionId = newId();
  const name = `Fleet ${organisationId.slice(-6)}`;
  const currency = country === 'US' ? 'USD' : 'EUR';
  const asOwner: Tenant['asOwner'] = (work) => asTenant(databases.owner, { organisationId }, work);

  const addPerson = async ({ roles = ['technician'], mayRelease = false, password, email = `${randomUUID()}@people.test` }: PersonOptions = {}): Promise<Ctx> => {
    const id = newId();
    const personName = `Person ${id.slice(-6)}`;
    await asOwner(async (tx) => {
      await tx.insert(person).values({ id, name: personName, email, passwordHash: password && (await hashPassword(password)) });
      await tx.insert(membership).values({ organisationId, personId: id, roles: [...roles], siteId, mayRelease, releaseBasis: mayRelease ? 'Test' : null });
    });
    return {
      db: databases.app,
      organisation: { id: organisationId, name, country, currency },
      person: { id, name: personName, email, units: country === 'US' ? US_UNITS : METRIC_UNITS, siteId },
      roles,
      mayRelease,
      now,
      jobs,
      storage,
      signingSecret: TEST_SECRET,
    };
  };

  await asOwner(async (tx) => {
    await tx.insert(organisation).values({ id: organisationId, name, country, currency, labourRatePerHour: 120 });
    await tx.insert(site).values({ organisationId, id: siteId, name: 'Yard', timeZone });
    if (rulebook) {
      const upstreamNumber = await publishUpstream(tx, rulebook);
      await publishFirstEdition(tx, { organisationId, id: editionId, rulebook, upstreamNumber, at: now() });
    }
  });
  const ctx = await addPerson(options);
  return { ctx, organisationId, siteId, editionId, personId: ctx.person.id, addPerson, asOwner };
}

/** Signs links in tests. */
export const TEST_SECRET = 'a secret for tests alone, of no use anywhere';

/** Somebody who isn't signed in, from a network address of his own unless one is given. */
export const makeVisitor = (databases: TestDatabases, { network = randomUUID(), now = () => new Date() }: Partial<Visitor> = {}): Visitor => ({
  db: databases.app,
  network,
  now,
  jobs,
  signingSecret: TEST_SECRET,
});
