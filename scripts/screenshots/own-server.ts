import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build, isBuilt } from '../lib/build.mjs';
import { appEnvironment, SERVICES } from '../lib/environment.mjs';
import { freePort } from '../lib/ports.mjs';
import { prepare } from '../lib/prepare.mjs';
import type { Run } from '../lib/private-database.mjs';
import { withClient } from '../lib/roles.mjs';
import { seed } from '../lib/seed.mjs';
import { startWeb, startWorker } from '../lib/services.mjs';
import { startMail, startStorage } from '../lib/stand-ins.mjs';
import { TEST_DIST_DIR } from '../lib/test-parts.mjs';
import { copyTemplate, makeTemplate, startThrowAwayCluster } from '../lib/throw-away-cluster.mjs';
import type { Stage } from './pages';

export type OwnServer = Awaited<ReturnType<typeof startOwnServer>>;

/** What makes the database be as a stage needs it. Children first: nothing cascades into what the shell itself reads. */
const CHANGES: Record<Stage, string> = {
  seeded: 'select 1',
  emptied: 'truncate table unit, compressor_model, "case" cascade',
  broken: 'alter table compressor_model rename to mislaid; alter table "case" rename to mislaid_too',
};

/** Makes a database that nobody else uses be as a stage needs it. */
export const become = (superuserUrl: string, stage: Stage): Promise<void> =>
  withClient(superuserUrl, async (client) => void (await client.query(CHANGES[stage])));

/** The built application over a demo of its own, which may be emptied and broken. Stops with the run's other processes. */
export async function startOwnServer(run: Run) {
  const { processes, steps } = run;
  await prepare(run);
  const given = Object.fromEntries(
    Object.entries(process.env).filter((entry): entry is [string, string] => entry[1] !== undefined && !SERVICES.includes(entry[0]) && entry[0] !== 'NODE_ENV'),
  );
  const folder = mkdtempSync(join(tmpdir(), 'carryover-screenshots-'));
  const log = (name: string) => join(folder, `${name}.log`);
  if (!isBuilt(TEST_DIST_DIR)) await steps.step('building', () => build(processes, TEST_DIST_DIR, given));
  return steps.step('starting a server over a demo of its own', async () => {
    const cluster = await startThrowAwayCluster(run);
    const database = await copyTemplate(cluster, await makeTemplate(cluster, ({ ownerUrl }) => seed(processes, ownerUrl, given)));
    const mail = await startMail(processes, { folder: join(folder, 'mail'), log: log('mail'), env: given });
    const storage = await startStorage(processes, { folder: join(folder, 's3'), log: log('storage'), env: given });
    const port = await freePort();
    const env = {
      ...appEnvironment(given, {
        mode: 'production',
        port,
        nextauthSecret: 'demo-only-for-one-run-of-the-screenshots',
        appUrl: database.appUrl,
        smtpUrl: mail.smtpUrl,
        storage: storage.settings,
      }),
      NEXT_DIST_DIR: TEST_DIST_DIR,
    };
    await startWeb(processes, { command: 'start', port, env, log: log('web') });
    startWorker(processes, { env, log: log('worker') });
    return {
      url: `http://127.0.0.1:${port}`,
      letters: async () => (await (await fetch(`${mail.page}/letters.json`)).json()) as { links: string[] }[],
      become: (stage: Stage) => become(database.superuserUrl, stage),
      removeFiles: () => rmSync(folder, { recursive: true, force: true }),
    };
  });
}
