import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, rmSync, statSync } from 'node:fs';
import { join, relative } from 'node:path';
import { readIfThere, writeWhole } from './files.mjs';
import { inProject, root } from './paths.mjs';

/** What a build is made from. A test or a document that changes asks for no new build. */
const SOURCES = [
  'app', 'components', 'db', 'lib', 'public',
  'proxy.ts', 'instrumentation.ts', 'instrumentation-client.ts',
  'next.config.mjs', 'tailwind.config.ts', 'postcss.config.mjs', 'tsconfig.json', 'package.json', 'package-lock.json',
];

/** @param {string} path @returns {string[]} the files at or under it, in a fixed order */
function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (!statSync(path).isDirectory()) return [path];
  return readdirSync(path).sort().flatMap((name) => filesUnder(join(path, name)));
}

/** A fingerprint of everything that goes into a build. */
export function sourceHash() {
  const hash = createHash('sha256');
  for (const file of SOURCES.flatMap((source) => filesUnder(inProject(source)))) {
    hash.update(`${relative(root, file)}\0`).update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/** @param {string} distDir */
const stampPath = (distDir) => inProject(distDir, 'carryover-build');

/** @param {string} distDir */
export const isBuilt = (distDir) => readIfThere(stampPath(distDir))?.trim() === sourceHash();

/**
 * Builds for production. The stamp goes first and comes back last, so that a killed build is made again.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {string} distDir
 * @param {Record<string, string>} env
 */
export async function build(processes, distDir, env) {
  const hash = sourceHash();
  rmSync(stampPath(distDir), { force: true });
  await processes.run('build', process.execPath, [inProject('node_modules', 'next', 'dist', 'bin', 'next'), 'build'], {
    cwd: root,
    env: { ...env, NEXT_DIST_DIR: distDir, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
  });
  writeWhole(stampPath(distDir), `${hash}\n`);
}
