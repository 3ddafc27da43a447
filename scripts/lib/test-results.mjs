import { relative } from 'node:path';
import { readIfThere } from './files.mjs';
import { root } from './paths.mjs';

/**
 * What one part of `npm test` came to.
 * @typedef {{ passed: number, failed: number, failures: { title: string, text: string }[] }} PartResult
 */

/** @param {string} title @param {string} text @returns {PartResult} */
export const oneFailure = (title, text) => ({ passed: 0, failed: 1, failures: [{ title, text }] });

/** @type {PartResult} */
export const onePass = { passed: 1, failed: 0, failures: [] };

/**
 * Reads Vitest's JSON report. Three things that it calls no failure are one here: a file that can't be loaded, a test
 * that is skipped, and a project without any test.
 * @param {string} project
 * @param {string} path
 * @param {{ exitedWell: boolean, output: string }} run
 * @returns {PartResult}
 */
export function readVitestReport(project, path, { exitedWell, output }) {
  const text = readIfThere(path);
  if (text === undefined) return oneFailure(project, output);
  /** @type {{ testResults: { name: string, status: string, message: string, assertionResults: { fullName: string, status: string, failureMessages: string[] }[] }[] }} */
  const report = JSON.parse(text);
  /** @type {PartResult['failures']} */
  const failures = [];
  let passed = 0;
  for (const { name, status, message, assertionResults } of report.testResults) {
    const file = relative(root, name);
    for (const test of assertionResults) {
      if (test.status === 'passed') passed += 1;
      else failures.push({ title: `${file}: ${test.fullName}`, text: test.failureMessages.join('\n') || `was ${test.status}; every test has to run` });
    }
    const explained = assertionResults.some((test) => test.status !== 'passed');
    if (status === 'failed' && !explained) failures.push({ title: file, text: message });
  }
  const noTest = `There is no test in the project "${project}".`;
  if (failures.length === 0 && (passed === 0 || !exitedWell)) failures.push({ title: project, text: passed === 0 ? `${noTest}\n${output}` : output });
  return { passed, failed: failures.length, failures };
}

/**
 * Reads the count line that the fault runs end with.
 * @param {string} output
 * @returns {PartResult}
 */
export function readCountLine(output) {
  const [, passed, failed] = [...output.matchAll(/(\d+) passed, (\d+) failed/g)].at(-1) ?? [];
  if (passed === undefined) return oneFailure('seeded faults', output || 'No count was printed.');
  const failures = Number(failed) > 0 ? [{ title: 'seeded faults', text: output }] : [];
  return { passed: Number(passed), failed: Number(failed), failures };
}
