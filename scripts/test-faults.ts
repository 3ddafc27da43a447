/**
 * `npm run test:faults`: tests the tests. Each fault is planted in a copy of lib/diagnose and the suite is run against
 * the copy: it must turn red, by failing tests and not by a copy that can't be loaded. An unharmed copy must stay green.
 */
import { mkdirSync, readdirSync, rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { UserWorkspaceConfig } from 'vitest/config';
import { startVitest, type TestModule } from 'vitest/node';
import { FAULTS, type Fault } from './faults/faults';
import { plant } from './faults/plant';

const ROOT = resolve(fileURLToPath(new URL('..', import.meta.url)));
const SOURCE = join(ROOT, 'lib/diagnose');
const TESTS = 'tests/unit/diagnose/core';
const UNHARMED = 'unharmed';

async function main(): Promise<number> {
  const copies = join(ROOT, '.test', `faults-${process.pid}`);
  mkdirSync(copies, { recursive: true });
  try {
    const everyTest = readdirSync(join(ROOT, TESTS)).filter((file) => file.endsWith('.test.ts'));
    const projects = [
      projectFor(copies, UNHARMED, everyTest),
      ...FAULTS.map((fault, index) => projectFor(copies, nameOf(index), fault.tests, fault)),
    ];
    const modules = await run(projects);
    return report(modules);
  } finally {
    rmSync(copies, { recursive: true, force: true });
  }
}

const nameOf = (index: number) => `fault-${index + 1}`;

/** One copy with the tests that look at it, resolved to the copy wherever they import lib/diagnose. */
function projectFor(copies: string, name: string, tests: readonly string[], fault?: Fault): UserWorkspaceConfig {
  const copy = join(copies, name);
  plant(SOURCE, copy, fault);
  return {
    root: ROOT,
    resolve: {
      alias: [
        { find: /^@\/lib\/diagnose/, replacement: copy },
        { find: /^@\//, replacement: `${ROOT}/` },
      ],
    },
    test: { name, isolate: false, include: tests.map((file) => `${TESTS}/${file}`), setupFiles: [join(ROOT, 'scripts/faults/setup.ts')] },
  };
}

async function run(projects: UserWorkspaceConfig[]): Promise<TestModule[]> {
  const vitest = await startVitest('test', [], { config: false, root: ROOT, watch: false, reporters: [{}], projects });
  const modules = vitest.state.getTestModules();
  await vitest.close();
  // Vitest takes failing tests for a failure of the run; here they are the aim.
  process.exitCode = 0;
  return modules;
}

/** Prints one line for each copy; returns the number of failures. */
function report(modules: readonly TestModule[]): number {
  const results = [UNHARMED, ...FAULTS.map((_, index) => nameOf(index))].map((name, index) => {
    const own = modules.filter(({ project }) => project.name === name);
    const tests = own.flatMap((module) => [...module.children.allTests()]);
    const red = tests.filter((test) => test.result().state === 'failed').length;
    const broken = own.length === 0 || tests.length === 0 || own.some((module) => module.errors().length > 0);
    const fault = FAULTS[index - 1];
    const passed = !broken && (fault ? red > 0 : red === 0);
    const told = broken ? 'could not be run' : `${red} of ${tests.length} tests red`;
    console.log(`${passed ? 'passed' : 'FAILED'}  ${fault ? `${fault.name} (${fault.file})` : 'no fault planted'}: ${told}`);
    return passed;
  });
  const passed = results.filter(Boolean).length;
  console.log(`${passed} passed, ${results.length - passed} failed`);
  return results.length - passed;
}

process.exitCode = (await main()) === 0 ? 0 : 1;
