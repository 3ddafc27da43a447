import { rmSync } from 'node:fs';
import { migrate } from '../migrate.mjs';
import { runCommand } from './command.mjs';
import { withDotenv } from './dotenv.mjs';
import { readPlan } from './environment.mjs';
import { takeStartLock } from './lock-file.mjs';
import { inProject, local } from './paths.mjs';
import { prepare } from './prepare.mjs';
import { startPrivateDatabase } from './private-database.mjs';
import { Problem } from './problem.mjs';
import { DATABASE, ensureDatabase, withClient } from './roles.mjs';
import { keptSecrets } from './secrets.mjs';
import { seed } from './seed.mjs';

/**
 * Puts the demo back as it was first: database, files and mail of the private set-up. It never touches a database that
 * is pointed at from outside. Killed half-way it leaves an empty database, which the next start fills.
 */
export function resetDemo() {
  let unlock = () => {};
  return runCommand(
    local.run,
    async (run) => {
      unlock = await takeStartLock(local.lock, 'Stop it with Ctrl-C, then run npm run reset-demo again.');
      const given = withDotenv(inProject('.env'), process.env);
      if (!readPlan(given).ownDatabase) {
        throw new Problem('DATABASE_URL points at a database of your own, and the demo is only ever put into the private one.', 'Leave DATABASE_URL and DATABASE_OWNER_URL out to reset the private one.');
      }
      await prepare(run);
      const database = await startPrivateDatabase(run, keptSecrets(local.secrets));
      await run.steps.step('putting the demo back', async () => {
        await withClient(database.serverUrl, (client) => client.query(`drop database ${DATABASE} with (force)`));
        await ensureDatabase(database.serverUrl, DATABASE);
        await migrate(database.ownerUrl);
        await seed(run.processes, database.ownerUrl, given);
        rmSync(local.mail, { recursive: true, force: true });
        rmSync(local.s3, { recursive: true, force: true });
      });
      run.steps.line('\nThe demo is as it was first. Start it with: npm start');
      return 0;
    },
    () => unlock(),
  );
}
