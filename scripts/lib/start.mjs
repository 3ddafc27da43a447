import { join } from 'node:path';
import { build, isBuilt } from './build.mjs';
import { runCommand } from './command.mjs';
import { withDotenv } from './dotenv.mjs';
import { appEnvironment, readPlan } from './environment.mjs';
import { takeStartLock } from './lock-file.mjs';
import { inProject, local, root } from './paths.mjs';
import { webPort } from './ports.mjs';
import { prepare } from './prepare.mjs';
import { startPrivateDatabase } from './private-database.mjs';
import { Problem } from './problem.mjs';
import { CommandFailed } from './processes.mjs';
import { keptSecrets } from './secrets.mjs';
import { demoSignIns, isEmpty, seed } from './seed.mjs';
import { hasWorker, startWeb, startWorker } from './services.mjs';
import { startMail, startStorage } from './stand-ins.mjs';
import { migrate } from '../migrate.mjs';

const DIST_DIR = process.env.NEXT_DIST_DIR ?? '.next';
/** The mail page is looked for by habit, so it keeps its place: this far above the web server's port. */
const MAIL_PAGE_OFFSET = 25;

/** @param {string} name */
const logFile = (name) => join(local.log, `${name}.log`);

/**
 * Refuses before anything is built what the app would refuse at its first request.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {Record<string, string>} env
 */
async function checkEnvironment(processes, env) {
  try {
    await processes.run('check-environment', process.execPath, ['--import', 'tsx', inProject('scripts', 'check-environment.ts')], { cwd: root, env });
  } catch (error) {
    if (!(error instanceof CommandFailed)) throw error;
    throw new Problem(error.output.trim(), 'Put that right in the environment or in .env, and start again.');
  }
}

/** @param {{ port: number, mailPage?: string, showDemo: boolean }} up */
function summary({ port, mailPage, showDemo }) {
  const lines = ['', `Carryover is at http://127.0.0.1:${port}`];
  if (mailPage) lines.push(`Mail that it sends: ${mailPage}`);
  const signIns = showDemo ? demoSignIns() : [];
  if (signIns.length > 0) {
    const [roles, emails] = [signIns.map(({ role }) => role.length), signIns.map(({ email }) => email.length)].map((lengths) => Math.max(...lengths));
    lines.push('', 'Sign in as', ...signIns.map(({ role, email, password }) => `  ${role.padEnd(roles)}   ${email.padEnd(emails)}   ${password}`));
  }
  return [...lines, '', `Logs are in ${local.log}. Ctrl-C stops everything.`];
}

/**
 * From a fresh clone to a served address; what is done already is skipped.
 * @param {{ development: boolean }} options
 */
export function start({ development }) {
  let unlock = () => {};
  return runCommand(
    local.run,
    async (run) => {
      const { processes, steps, untilStopped } = run;
      unlock = takeStartLock(local.lock, 'Use that one, or stop it with Ctrl-C first; a second copy needs a folder of its own.');
      const given = withDotenv(inProject('.env'), process.env);
      const plan = readPlan(given);
      await prepare(run);
      const port = await webPort(given.PORT);
      const secrets = keptSecrets(local.secrets);

      const database = plan.ownDatabase
        ? await startPrivateDatabase(run, secrets)
        : { ownerUrl: given.DATABASE_OWNER_URL, appUrl: given.DATABASE_URL };
      const mail = plan.ownMail
        ? await steps.step('starting the local mail service', async (say) => {
            const started = await startMail(processes, { folder: local.mail, log: logFile('mail'), env: given, preferredPagePort: port + MAIL_PAGE_OFFSET });
            say(started.page);
            return started;
          })
        : undefined;
      const storage = plan.ownStorage
        ? await steps.step('starting the local file storage', async (say) => {
            const started = await startStorage(processes, { folder: local.s3, log: logFile('storage'), env: given });
            say(started.settings.S3_ENDPOINT);
            return started;
          })
        : undefined;
      const env = appEnvironment(given, {
        mode: development ? 'development' : 'production',
        port,
        nextauthSecret: secrets.nextauth,
        appUrl: database.appUrl,
        smtpUrl: mail?.smtpUrl,
        storage: storage?.settings,
      });
      await steps.step('checking the environment', () => checkEnvironment(processes, env));
      await steps.step('bringing the database up to date', () => migrate(database.ownerUrl));
      if (database.superuserUrl && (await isEmpty(database.superuserUrl))) {
        await steps.step('filling in the demo organisation', () => seed(processes, database.ownerUrl, env));
      }
      if (!development && !isBuilt(DIST_DIR)) await steps.step('building the app', () => build(processes, DIST_DIR, env));

      const shown = (/** @type {string} */ name) => (development ? undefined : logFile(name));
      const web = await steps.step(development ? 'starting the development server' : 'starting the web server', () =>
        startWeb(processes, { command: development ? 'dev' : 'start', port, env, log: shown('web') }),
      );
      const worker = hasWorker() ? await steps.step('starting the worker', () => startWorker(processes, { env, log: shown('worker') })) : undefined;
      for (const line of summary({ port, mailPage: mail?.page, showDemo: plan.ownDatabase })) steps.line(line);

      const services = { 'web server': web, worker, 'database server': database.child, 'mail service': mail?.child, 'file storage': storage?.child };
      return Promise.race([untilStopped(), firstToEnd(services, processes)]);
    },
    () => unlock(),
  );
}

/**
 * Fails as soon as one of the services ends by itself: half of Carryover helps nobody.
 * @param {Record<string, import('node:child_process').ChildProcess | undefined>} services
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @returns {Promise<never>}
 */
const firstToEnd = (services, processes) =>
  new Promise((_resolve, reject) => {
    for (const [name, child] of Object.entries(services)) {
      const ended = () => processes.stopping || reject(new Problem(`The ${name} ended by itself.`, `Its log is in ${local.log}; start again with the same command.`));
      if (child?.exitCode === null && child.signalCode === null) child.once('exit', ended);
      else if (child) ended();
    }
  });
