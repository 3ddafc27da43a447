import { join } from 'node:path';
import { build, isBuilt } from './build.mjs';
import { runCommand } from './command.mjs';
import { withDotenv } from './dotenv.mjs';
import { appEnvironment, readPlan } from './environment.mjs';
import { lastLines } from './files.mjs';
import { takeStartLock } from './lock-file.mjs';
import { inProject, local, root } from './paths.mjs';
import { webPort } from './ports.mjs';
import { prepare } from './prepare.mjs';
import { startPrivateDatabase } from './private-database.mjs';
import { Problem } from './problem.mjs';
import { CommandFailed } from './processes.mjs';
import { keptSecrets } from './secrets.mjs';
import { demoSignIns, isEmpty, seed } from './seed.mjs';
import { startWeb, startWorker } from './services.mjs';
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

/**
 * Starts the stand-ins that nothing outside takes the place of.
 * @param {import('./private-database.mjs').Run} run
 * @param {{ plan: ReturnType<typeof readPlan>, given: Record<string, string>, port: number }} wanted
 */
async function startStandIns({ processes, steps }, { plan, given, port }) {
  if (!plan.ownMail && !plan.ownStorage) return {};
  const names = [plan.ownMail && 'mail', plan.ownStorage && 'files'].filter(Boolean).join(' and ');
  return steps.step(`starting the local stand-ins for ${names}`, async () => {
    const [mail, storage] = await Promise.all([
      plan.ownMail ? startMail(processes, { folder: local.mail, log: logFile('mail'), env: given, preferredPagePort: port + MAIL_PAGE_OFFSET }) : undefined,
      plan.ownStorage ? startStorage(processes, { folder: local.s3, log: logFile('storage'), env: given }) : undefined,
    ]);
    return { mail, storage };
  });
}

/** @param {{ port: number, mailPage?: string, showDemo: boolean }} up */
function summary({ port, mailPage, showDemo }) {
  const lines = ['', `Carryover is at http://127.0.0.1:${port}`];
  if (mailPage) lines.push(`Mail that it sends: ${mailPage}`);
  if (showDemo) {
    const people = demoSignIns();
    const [roles, emails] = [people.map(({ role }) => role.length), people.map(({ email }) => email.length)].map((lengths) => Math.max(...lengths));
    lines.push('', 'Sign in as', ...people.map(({ role, email, password }) => `  ${role.padEnd(roles)}   ${email.padEnd(emails)}   ${password}`));
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
      unlock = await takeStartLock(local.lock, 'Use that one, or stop it with Ctrl-C first; a second copy needs a folder of its own.');
      const given = withDotenv(inProject('.env'), process.env);
      const plan = readPlan(given);
      await prepare(run);
      const port = await webPort(given.PORT);
      const secrets = keptSecrets(local.secrets);

      const database = plan.ownDatabase ? await startPrivateDatabase(run, secrets) : { ownerUrl: given.DATABASE_OWNER_URL, appUrl: given.DATABASE_URL };
      const { mail, storage } = await startStandIns(run, { plan, given, port });
      const env = appEnvironment(given, {
        mode: development ? 'development' : 'production',
        port,
        nextauthSecret: secrets.nextauth,
        appUrl: database.appUrl,
        smtpUrl: mail?.smtpUrl,
        storage: storage?.settings,
      });
      if (plan.anythingSet) await steps.step('checking the environment', () => checkEnvironment(processes, env));
      await steps.step('bringing the database up to date', () => migrate(database.ownerUrl));
      if (database.superuserUrl && (await isEmpty(database.superuserUrl))) {
        await steps.step('filling in the demo organisation', () => seed(processes, database.ownerUrl, env));
      }
      if (!development && !isBuilt(DIST_DIR)) await steps.step('building the app', () => build(processes, DIST_DIR, env));

      const shown = (/** @type {string} */ name) => (development ? undefined : logFile(name));
      const startServices = () =>
        Promise.all([
          startWeb(processes, { command: development ? 'dev' : 'start', port, env, log: shown('web') }),
          startWorker(processes, { env, log: shown('worker') }),
        ]);
      // In development both print to this terminal themselves, which a line that waits for its end would be torn by.
      if (development) steps.line('  starting the development server and the worker');
      const [web, worker] = development ? await startServices() : await steps.step('starting the web server and the worker', startServices);
      for (const line of summary({ port, mailPage: mail?.page, showDemo: plan.ownDatabase })) steps.line(line);

      const services = { web, worker, postgres: database.child, mail: mail?.child, storage: storage?.child };
      return Promise.race([untilStopped(), firstToEnd(services, processes)]);
    },
    () => unlock(),
  );
}

/**
 * Fails as soon as one of the services ends by itself: half of Carryover helps nobody.
 * @param {Record<string, import('node:child_process').ChildProcess | undefined>} services by the name of their log
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @returns {Promise<never>}
 */
const firstToEnd = (services, processes) =>
  new Promise((_resolve, reject) => {
    for (const [name, child] of Object.entries(services)) {
      const ended = () => processes.stopping || reject(new Problem(`The ${name} process ended by itself. Its log, ${logFile(name)}, ends:\n${lastLines(logFile(name))}`, 'Start again with the same command.'));
      if (child?.exitCode === null && child.signalCode === null) child.once('exit', ended);
      else if (child) ended();
    }
  });
