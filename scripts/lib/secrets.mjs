import { randomBytes } from 'node:crypto';
import { readIfThere, writeWhole } from './files.mjs';

/** Marks a secret as made for a demo on one machine; `lib/env.ts` refuses it in production. */
export const DEMO_MARK = 'demo-';

const names = /** @type {const} */ (['postgres', 'owner', 'app', 'nextauth']);

/** @returns {Record<(typeof names)[number], string>} */
export const makeSecrets = () =>
  Object.fromEntries(names.map((name) => [name, `${DEMO_MARK}${randomBytes(24).toString('hex')}`]));

/**
 * The generated secrets of this machine, kept so that sign-ins survive a restart. An unreadable file is made anew: the
 * database's passwords are set again from it at every start.
 * @param {string} path
 */
export function keptSecrets(path) {
  try {
    const kept = JSON.parse(readIfThere(path) ?? '{}');
    if (names.every((name) => typeof kept[name] === 'string')) return kept;
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
  }
  const made = makeSecrets();
  writeWhole(path, `${JSON.stringify(made, null, 2)}\n`, 0o600);
  return made;
}
