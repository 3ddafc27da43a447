import { readFileSync } from 'node:fs';
import { inProject, root } from './paths.mjs';
import { withClient } from './roles.mjs';

/** Whether the database holds no organisation yet; asked as superuser, whom row-level security doesn't blind. @param {string} url */
export const isEmpty = (url) => withClient(url, async (client) => (await client.query('select from organisation limit 1')).rowCount === 0);

/**
 * Puts the demo organisation in, in one transaction of the seed's own: a killed one leaves the database empty.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {string} ownerUrl
 * @param {Record<string, string>} env
 */
export async function seed(processes, ownerUrl, env) {
  await processes.run('seed', process.execPath, ['--import', 'tsx', inProject('db', 'seed', 'index.ts')], { cwd: root, env: { ...env, DATABASE_OWNER_URL: ownerUrl } });
}

/** @returns {{ role: string, name: string, email: string, password: string }[]} */
export const demoSignIns = () => JSON.parse(readFileSync(inProject('db', 'seed', 'sign-ins.json'), 'utf8'));
