import { databaseUrl } from './cluster.mjs';

/** The owner migrates; the app's role owns nothing, so row-level security holds for it. */
export const OWNER = 'carryover_owner';
export const APP = 'carryover_app';
export const DATABASE = 'carryover';

/**
 * @template T
 * @param {string} url
 * @param {(client: import('pg').Client) => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withClient(url, work) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/**
 * Makes the two roles, or sets their passwords anew.
 * @param {string} superuserUrl
 * @param {{ owner: string, app: string }} passwords
 */
export const ensureRoles = (superuserUrl, passwords) =>
  withClient(superuserUrl, async (client) => {
    const wanted = /** @type {const} */ ([
      [OWNER, passwords.owner],
      [APP, passwords.app],
    ]);
    for (const [role, password] of wanted) {
      const { rowCount } = await client.query('select from pg_roles where rolname = $1', [role]);
      const verb = rowCount === 0 ? 'create' : 'alter';
      await client.query(`${verb} role ${role} login nosuperuser nocreatedb nocreaterole nobypassrls password ${client.escapeLiteral(password)}`);
    }
  });

/**
 * Makes a database that belongs to the owner, unless it is there.
 * @param {string} superuserUrl
 * @param {string} name
 */
export const ensureDatabase = (superuserUrl, name) =>
  withClient(superuserUrl, async (client) => {
    const { rowCount } = await client.query('select from pg_database where datname = $1', [name]);
    if (rowCount === 0) await client.query(`create database ${client.escapeIdentifier(name)} owner ${OWNER}`);
    await client.query(`revoke all on database ${client.escapeIdentifier(name)} from public`);
    await client.query(`grant connect, temporary on database ${client.escapeIdentifier(name)} to ${APP}`);
  });

/**
 * How the two roles reach a database.
 * @param {number} port
 * @param {{ owner: string, app: string }} passwords
 * @param {string} database
 */
export const roleUrls = (port, passwords, database) => ({
  ownerUrl: databaseUrl({ port, user: OWNER, password: passwords.owner, database }),
  appUrl: databaseUrl({ port, user: APP, password: passwords.app, database }),
});
