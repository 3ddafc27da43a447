import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { connect } from '@/db/connect';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { ownEnvironment } from '@/tests/e2e/support/own-environment';
import { makeTenant } from '@/tests/support/tenant';
import { build, isBuilt } from '../lib/build.mjs';
import { appEnvironment } from '../lib/environment.mjs';
import { test } from '../lib/paths.mjs';
import { freePort } from '../lib/ports.mjs';
import { processKeeper } from '../lib/processes.mjs';
import { startWeb } from '../lib/services.mjs';
import { startMail, startStorage } from '../lib/stand-ins.mjs';
import { stepPrinter } from '../lib/steps.mjs';
import { TEST_DIST_DIR } from '../lib/test-parts.mjs';
import { copyTemplate, makeTemplate, startThrowAwayCluster } from '../lib/throw-away-cluster.mjs';

/** The built application with one technician and as many open cases as are asked for. */
export async function startBenchServer({ cases }: { cases: number }) {
  const processes = processKeeper(test.run);
  const folder = mkdtempSync(join(tmpdir(), 'carryover-bench-'));
  const log = (name: string) => join(folder, `${name}.log`);
  const given = ownEnvironment();
  if (!isBuilt(TEST_DIST_DIR)) await build(processes, TEST_DIST_DIR, given);
  const cluster = await startThrowAwayCluster({ processes, steps: stepPrinter() });
  const database = await copyTemplate(cluster, await makeTemplate(cluster));
  const [app, owner] = [connect(database.appUrl, { max: 3 }), connect(database.ownerUrl, { max: 2 })];
  const signIn = { email: 'bay@bench.test', password: 'a password of the bench alone' };
  const tenant = await makeTenant(
    { app: app.db, owner: owner.db, appUrl: database.appUrl, ownerUrl: database.ownerUrl, close: async () => undefined },
    { rulebook: defaultRulebook, ...signIn },
  );
  const caseIds: string[] = [];
  for (let i = 0; i < cases; i += 1) {
    const id = newId();
    await openCase({ ctx: tenant.ctx, input: { id, unit: { kind: 'new', id: newId(), fleetNumber: `B-${i}`, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
    caseIds.push(id);
  }
  const mail = await startMail(processes, { folder: join(folder, 'mail'), log: log('mail'), env: given });
  const storage = await startStorage(processes, { folder: join(folder, 's3'), log: log('storage'), env: given });
  const port = await freePort();
  const env = {
    ...appEnvironment(given, { mode: 'production', port, nextauthSecret: 'demo-only-for-one-run-of-the-bench', appUrl: database.appUrl, smtpUrl: mail.smtpUrl, storage: storage.settings }),
    NEXT_DIST_DIR: TEST_DIST_DIR,
  };
  await startWeb(processes, { command: 'start', port, env, log: log('web') });
  return {
    url: `http://127.0.0.1:${port}`,
    caseIds,
    signIn,
    async stop() {
      await Promise.all([app.close(), owner.close()]);
      await processes.stopAll();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

export type BenchServer = Awaited<ReturnType<typeof startBenchServer>>;
