import { chownSync, mkdtempSync, rmSync } from 'node:fs';
import type { ChildProcess } from 'node:child_process';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { connect } from '@/db/connect';
import { migrate } from '@/scripts/migrate.mjs';
import { startCluster } from '@/scripts/lib/cluster.mjs';
import { appEnvironment } from '@/scripts/lib/environment.mjs';
import { test } from '@/scripts/lib/paths.mjs';
import { freePort } from '@/scripts/lib/ports.mjs';
import { requirePostgres } from '@/scripts/lib/private-database.mjs';
import { serverUser } from '@/scripts/lib/postgres-user.mjs';
import { processKeeper } from '@/scripts/lib/processes.mjs';
import { ensureDatabase, ensureRoles, roleUrls } from '@/scripts/lib/roles.mjs';
import { makeSecrets } from '@/scripts/lib/secrets.mjs';
import { startWeb, startWorker } from '@/scripts/lib/services.mjs';
import { startMail, startStorage } from '@/scripts/lib/stand-ins.mjs';
import { stepPrinter } from '@/scripts/lib/steps.mjs';
import { TEST_DIST_DIR } from '@/scripts/lib/test-parts.mjs';
import { ownEnvironment } from './own-environment';
import { startRelay } from './relay';

const DATABASE = 'killable';

/**
 * Carryover on a cluster of its own that keeps what it has written, each part of which can be killed like a process
 * that runs out of memory or a machine that loses its power, and started again. Browser and web server, and web server
 * and database, are joined by wires that can be cut.
 */
export async function startKillable() {
  const folder = mkdtempSync(join(tmpdir(), 'carryover-killable-'));
  const processes = processKeeper(test.run);
  const steps = stepPrinter();
  const given = ownEnvironment();
  const log = (name: string) => join(folder, `${name}.log`);
  const secrets = makeSecrets();
  const user = serverUser();
  if (user.uid !== undefined) chownSync(folder, user.uid, user.gid ?? user.uid);
  const binaries = await requirePostgres({ processes, steps });
  const place = { data: join(folder, 'postgres'), binaries, user, processes, durable: true, log: log('postgres') };

  let cluster = await startCluster(place, secrets.postgres);
  await ensureRoles(cluster.superuserUrl, secrets);
  await ensureDatabase(cluster.superuserUrl, DATABASE);
  const databaseWire = await startRelay(cluster.port);
  const urls = roleUrls(databaseWire.port, secrets, DATABASE);
  await migrate(urls.ownerUrl);

  const mail = await startMail(processes, { folder: join(folder, 'mail'), log: log('mail'), env: given });
  const storage = await startStorage(processes, { folder: join(folder, 's3'), log: log('storage'), env: given });
  const webPort = await freePort();
  const webWire = await startRelay(webPort);
  const env = {
    ...appEnvironment(given, {
      mode: 'production',
      port: webPort,
      nextauthSecret: 'demo-only-for-one-run-of-the-end-to-end-tests',
      appUrl: urls.appUrl,
      smtpUrl: mail.smtpUrl,
      storage: storage.settings,
    }),
    NEXTAUTH_URL: `http://127.0.0.1:${webWire.port}`,
    NEXT_DIST_DIR: TEST_DIST_DIR,
  };
  const beginWeb = () => startWeb(processes, { command: 'start', port: webPort, env, log: log('web') });
  const beginWorker = () => startWorker(processes, { env, log: log('worker') });
  let web = await beginWeb();
  let worker = beginWorker();
  const app = connect(urls.appUrl, { max: 3 });
  const owner = connect(urls.ownerUrl, { max: 2 });

  async function kill(child: ChildProcess) {
    if (child.pid === undefined) return;
    try {
      process.kill(-child.pid, 'SIGKILL');
    } catch {
      // It is gone already, which is what was wanted.
    }
    await processes.stop(child.pid);
  }

  return {
    url: `http://127.0.0.1:${webWire.port}`,
    databases: { app: app.db, owner: owner.db, appUrl: urls.appUrl, ownerUrl: urls.ownerUrl, close: async () => undefined },
    webWire,
    async killWeb() {
      await kill(web);
      web = await beginWeb();
    },
    async killWorker() {
      await kill(worker);
      worker = beginWorker();
    },
    async killDatabase() {
      databaseWire.cut();
      await kill(cluster.child);
      cluster = await startCluster(place, secrets.postgres);
      databaseWire.leadTo(cluster.port);
      databaseWire.mend();
    },
    async stop() {
      await Promise.all([app.close(), owner.close()]).catch(() => undefined);
      await processes.stopAll();
      await Promise.all([webWire.close(), databaseWire.close()]);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

export type Killable = Awaited<ReturnType<typeof startKillable>>;
