import { fileURLToPath } from 'node:url';
import { join } from 'node:path';

/** The project's folder, whatever the working directory is. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** @param {...string} parts */
export const inProject = (...parts) => join(root, ...parts);

/** What a running copy keeps on this machine; git ignores it. */
export const local = {
  folder: inProject('.local'),
  run: inProject('.local', 'run'),
  log: inProject('.local', 'log'),
  mail: inProject('.local', 'mail'),
  s3: inProject('.local', 's3'),
  lock: inProject('.local', 'start.lock'),
  installLock: inProject('.local', 'install.lock'),
  secrets: inProject('.local', 'secrets.json'),
};

/** What a test run keeps; git ignores it too. */
export const test = {
  run: inProject('.test', 'run'),
  results: inProject('.test', 'results'),
};
