import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { aptInstall } from './apt.mjs';
import { build, isBuilt } from './build.mjs';
import { chromiumWanted, findChromium } from './chromium.mjs';
import { inProject, root, test } from './paths.mjs';
import { CommandFailed } from './processes.mjs';
import { onePass, oneFailure, readCountLine, readVitestReport } from './test-results.mjs';

/** A build folder of the tests' own: a Carryover that runs from this folder keeps its build. */
export const TEST_DIST_DIR = '.next-test';

/** Of what a failed check printed, so that a broken import doesn't bury everything else. */
const MOST_LINES = 60;

/** @typedef {{ name: string, run: () => Promise<import('./test-results.mjs').PartResult> }} Part */

/**
 * The parts of `npm test`, the quick ones first.
 * @param {import('./private-database.mjs').Run} run
 * @param {Record<string, string>} env
 * @returns {Part[]}
 */
export function testParts({ processes }, env) {
  /** @param {string} name @param {string} file @param {string[]} args */
  const node = (name, file, args) => processes.run(name, process.execPath, [inProject('node_modules', ...file.split('/')), ...args], { cwd: root, env });

  /** @param {string} name @param {() => Promise<unknown>} work @returns {Part} */
  const check = (name, work) => ({
    name,
    run: async () => {
      try {
        await work();
        return onePass;
      } catch (error) {
        if (!(error instanceof CommandFailed)) throw error;
        return oneFailure(name, error.output.trim().split('\n').slice(-MOST_LINES).join('\n'));
      }
    },
  });

  /** @param {string} name @param {string} project @returns {Part} */
  const vitest = (name, project) => ({
    name,
    run: async () => {
      const report = join(test.results, `${project}.json`);
      mkdirSync(test.results, { recursive: true });
      rmSync(report, { force: true });
      const args = ['run', '--project', project, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
      try {
        const output = await node(project, 'vitest/vitest.mjs', args);
        return readVitestReport(project, report, { exitedWell: true, output });
      } catch (error) {
        if (!(error instanceof CommandFailed)) throw error;
        return readVitestReport(project, report, { exitedWell: false, output: error.output });
      }
    },
  });

  /** @type {Part} */
  const faults = {
    name: 'seeded faults',
    run: async () => {
      try {
        return readCountLine(await node('faults', 'tsx/dist/cli.mjs', [inProject('scripts', 'test-faults.ts')]));
      } catch (error) {
        if (!(error instanceof CommandFailed)) throw error;
        const counted = readCountLine(error.output);
        return counted.failed > 0 ? counted : oneFailure('seeded faults', error.output);
      }
    },
  };

  /** @type {Part} */
  const endToEnd = {
    name: 'end-to-end tests',
    run: async () => {
      if (!findChromium()) await aptInstall(processes, chromiumWanted);
      return vitest('end-to-end tests', 'e2e').run();
    },
  };

  return [
    check('type check', async () => {
      await node('typegen', 'next/dist/bin/next', ['typegen']);
      await node('tsc', 'typescript/bin/tsc', ['--noEmit', '--project', 'tsconfig.test.json']);
    }),
    check('lint', () => node('eslint', 'eslint/bin/eslint.js', ['--max-warnings', '0', '.'])),
    vitest('unit tests', 'unit'),
    vitest('golden cases', 'golden'),
    vitest('outside values', 'checks'),
    faults,
    check('production build', async () => {
      if (!isBuilt(TEST_DIST_DIR)) await build(processes, TEST_DIST_DIR, env);
    }),
    vitest('integration tests', 'integration'),
    vitest('workers killed', 'kills'),
    endToEnd,
  ];
}
