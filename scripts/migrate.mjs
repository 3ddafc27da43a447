import { pathToFileURL } from 'node:url';
import { inProject } from './lib/paths.mjs';
import { Problem } from './lib/problem.mjs';

/** Any number will do as long as every migrator asks for the same one. */
const LOCK = 728_101;

/**
 * Brings the schema up to date as its owner. Several starts at once queue up on the lock, and each migrator applies what
 * is missing in one transaction, so a killed one leaves nothing half-done.
 * @param {string} ownerUrl
 */
export async function migrate(ownerUrl) {
  const [{ default: pg }, { drizzle }, { migrate: applyMissing }] = await Promise.all([
    import('pg'),
    import('drizzle-orm/node-postgres'),
    import('drizzle-orm/node-postgres/migrator'),
  ]);
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect().catch((error) => {
    const { hostname, port } = new URL(ownerUrl);
    throw new Problem(`The database at ${hostname}:${port || 5432} can't be opened as its owner: ${error.message}.`, 'Check that its server runs and that DATABASE_OWNER_URL is right, then run the command again.');
  });
  try {
    // Notices ("schema already exists, skipping") are no news.
    await client.query('set client_min_messages = warning');
    await client.query('select pg_advisory_lock($1)', [LOCK]);
    await applyMissing(drizzle(client), { migrationsFolder: inProject('drizzle') });
  } finally {
    await client.end();
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  if (!process.env.DATABASE_OWNER_URL) {
    console.error('DATABASE_OWNER_URL is not set. Set it to the address of the database as its owner.');
    process.exit(1);
  }
  await migrate(process.env.DATABASE_OWNER_URL);
}
