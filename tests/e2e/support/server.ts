import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { inject } from 'vitest';
import { appEnvironment } from '@/scripts/lib/environment.mjs';
import { test } from '@/scripts/lib/paths.mjs';
import { freePort } from '@/scripts/lib/ports.mjs';
import { processKeeper } from '@/scripts/lib/processes.mjs';
import { startWeb, startWorker } from '@/scripts/lib/services.mjs';
import { startMail, startStorage } from '@/scripts/lib/stand-ins.mjs';
import { TEST_DIST_DIR } from '@/scripts/lib/test-parts.mjs';
import { copyTemplate } from '@/scripts/lib/throw-away-cluster.mjs';
import { ownEnvironment } from './own-environment';

interface Letter {
  to: string;
  subject: string;
  text: string;
  links: string[];
}

export type TestServer = Awaited<ReturnType<typeof startServer>>;

/**
 * The built application as a user meets it: web, worker, mail and storage on free ports, over a copy of the demo that
 * no other test sees. Stop it in `afterAll`.
 */
export async function startServer() {
  const folder = mkdtempSync(join(tmpdir(), 'carryover-e2e-'));
  const processes = processKeeper(test.run);
  const database = await copyTemplate(inject('testCluster'), inject('seededTemplate'));
  const given = ownEnvironment();
  const log = (name: string) => join(folder, `${name}.log`);
  const mail = await startMail(processes, { folder: join(folder, 'mail'), log: log('mail'), env: given });
  const storage = await startStorage(processes, { folder: join(folder, 's3'), log: log('storage'), env: given });
  const port = await freePort();
  const env = {
    ...appEnvironment(given, {
      mode: 'production',
      port,
      nextauthSecret: 'demo-only-for-one-run-of-the-end-to-end-tests',
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
    database,
    /** Where it keeps photos. */
    storage: storage.settings,
    /** What was sent so far, the newest first. */
    async letters(): Promise<Letter[]> {
      return (await (await fetch(`${mail.page}/letters.json`)).json()) as Letter[];
    },
    /** What the web server has logged so far. */
    webLog: () => readFileSync(log('web'), 'utf8'),
    async stop() {
      await processes.stopAll();
      await database.drop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
