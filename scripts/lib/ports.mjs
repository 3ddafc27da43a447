import { createServer, connect } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { Problem } from './problem.mjs';

export const LOOPBACK = '127.0.0.1';

/**
 * @param {number} port 0 asks the system for any free one
 * @returns {Promise<number | undefined>} the port, or undefined when somebody has it
 */
const tryPort = (port) =>
  new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', (error) => (error.code === 'EADDRINUSE' ? resolve(undefined) : reject(error)));
    server.listen({ port, host: LOOPBACK, exclusive: true }, () => {
      const taken = server.address().port;
      server.close(() => resolve(taken));
    });
  });

/** A free port, the preferred one when it is free. @param {number} [preferred] */
export async function freePort(preferred = 0) {
  return (await tryPort(preferred)) ?? (await tryPort(0)) ?? 0;
}

/**
 * The web server's port from the environment, checked to be a free port before any long work begins.
 * @param {string | undefined} asked
 */
export async function webPort(asked) {
  const port = Number(asked ?? 3000);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Problem(`PORT is "${asked}", which is no port number.`, 'Set it to a number from 1024 to 65535, or leave it out for 3000.');
  }
  const free = await tryPort(port).catch((error) => {
    if (error.code !== 'EACCES') throw error;
    throw new Problem(`This user may not serve on port ${port}.`, 'Choose one from 1024 up, for example: PORT=3000 npm start');
  });
  if (free === undefined) {
    throw new Problem(
      `Port ${port} is already in use by another program.`,
      `Stop that program, or choose another port, for example: PORT=${port + 1} npm start`,
    );
  }
  return port;
}

/** @param {number} port @returns {Promise<boolean>} */
const accepts = (port) =>
  new Promise((resolve) => {
    const socket = connect(port, LOOPBACK);
    socket.once('connect', () => resolve(true)).once('error', () => resolve(false));
    socket.once('connect', () => socket.destroy());
  });

/**
 * Waits until something accepts connections on the port, as long as the process that should do so is alive.
 * @param {number} port
 * @param {import('node:child_process').ChildProcess} child
 */
export async function untilAccepting(port, child) {
  while (!(await accepts(port))) {
    if (child.exitCode !== null || child.signalCode !== null) return false;
    await sleep(20);
  }
  return true;
}
