import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

/**
 * Writes the whole file or none of it, so that a killed run leaves no half-written one.
 * @param {string} path
 * @param {string} text
 * @param {number} [mode]
 */
export function writeWhole(path, text, mode = 0o644) {
  mkdirSync(dirname(path), { recursive: true });
  const draft = `${path}.${process.pid}.new`;
  rmSync(draft, { force: true });
  writeFileSync(draft, text, { mode });
  renameSync(draft, path);
}

/** The file's text, or undefined when there is none. @param {string} path */
export function readIfThere(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return undefined;
    throw error;
  }
}

/** The end of a log, to show beside what went wrong. @param {string} path */
export const lastLines = (path) => (readIfThere(path) ?? '').trim().split('\n').slice(-12).join('\n');
