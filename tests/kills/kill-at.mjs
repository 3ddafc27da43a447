/**
 * Preloaded into a worker that is to be killed. It loads what the worker will need, waits for its orders, and from the
 * moment at which its job has come over the wire counts what goes over any wire, in or out: statements, answers, the
 * mail server's words. At the step that it was given it kills its own process, which nothing in it notices.
 */
import { Socket } from 'node:net';

/** @typedef {{ env: Record<string, string>, marker: string, point: number }} Orders */

/** @type {Orders} */
let orders;
let steps = 0;
let hasBegun = false;
/** At the last step of the job: what a worker does afterwards is its waiting for the next. */
let lastStep;

/** Of the statement by which pg-boss notes a job as done. */
const DONE = 'completed_on = now()';
/** Its messages on their way out, and their answer. */
const STEPS_OF_DONE = 10;

/** @param {unknown} chunk */
const textOf = (chunk) => (typeof chunk === 'string' ? chunk : chunk instanceof Uint8Array ? Buffer.from(chunk).toString('latin1') : '');

function step() {
  if (!hasBegun) return;
  steps += 1;
  if (steps >= orders.point) process.kill(process.pid, 'SIGKILL');
}

const { write } = Socket.prototype;
Socket.prototype.write = function (...args) {
  if (hasBegun && lastStep === undefined && textOf(args[0]).includes(DONE)) lastStep = steps + STEPS_OF_DONE;
  step();
  const written = write.apply(this, args);
  // What was written is out, and no answer has come.
  step();
  return written;
};
const { push } = Socket.prototype;
Socket.prototype.push = function (chunk, ...rest) {
  if (chunk !== null && !hasBegun) hasBegun = Buffer.from(chunk).includes(orders.marker);
  else if (chunk !== null) step();
  return push.call(this, chunk, ...rest);
};

await Promise.all(['pg-boss', 'pg', 'drizzle-orm/node-postgres', 'nodemailer', '@aws-sdk/client-s3', '@aws-sdk/s3-presigned-post', '@aws-sdk/s3-request-presigner', 'sharp', '@react-pdf/renderer', 'zod', 'pino'].map((name) => import(name)));
process.send('ready');
orders = await new Promise((resolve) => process.once('message', resolve));
Object.assign(process.env, orders.env);
process.on('message', () => process.send(lastStep ?? steps));
