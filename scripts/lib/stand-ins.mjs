import { lastLines } from './files.mjs';
import { inProject } from './paths.mjs';
import { freePort, LOOPBACK, untilAccepting } from './ports.mjs';
import { Problem } from './problem.mjs';

/** The stand-in's keys are fixed by the library; lib/env.ts refuses them in production. */
const STORAGE_KEY = 'S3RVER';
const BUCKET = 'carryover';

/**
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {{ name: string, script: string, args: string[], port: number, log: string, env: Record<string, string> }} service
 */
async function startScript(processes, { name, script, args, port, log, env }) {
  const child = processes.start(name, process.execPath, [inProject('scripts', 'local', script), ...args], { log, env });
  if (!(await untilAccepting(port, child))) throw new Problem(`The local ${name} service did not start.`, `The end of its log, ${log}:\n${lastLines(log)}`);
  return child;
}

/**
 * Starts the mail stand-in.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {{ folder: string, log: string, env: Record<string, string>, preferredPagePort?: number }} place
 */
export async function startMail(processes, { folder, log, env, preferredPagePort }) {
  const pagePort = await freePort(preferredPagePort);
  const smtpPort = await freePort();
  const child = await startScript(processes, { name: 'mail', script: 'mail.mjs', args: [folder, String(smtpPort), String(pagePort)], port: pagePort, log, env });
  return { child, smtpUrl: `smtp://${LOOPBACK}:${smtpPort}`, page: `http://${LOOPBACK}:${pagePort}` };
}

/**
 * Starts the storage stand-in.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {{ folder: string, log: string, env: Record<string, string> }} place
 */
export async function startStorage(processes, { folder, log, env }) {
  const port = await freePort();
  const child = await startScript(processes, { name: 'storage', script: 's3.mjs', args: [folder, String(port), BUCKET], port, log, env });
  const settings = { S3_ENDPOINT: `http://${LOOPBACK}:${port}`, S3_BUCKET: BUCKET, S3_ACCESS_KEY: STORAGE_KEY, S3_SECRET_KEY: STORAGE_KEY, S3_REGION: 'us-east-1' };
  return { child, settings };
}
