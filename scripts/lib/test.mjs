import { runCommand } from './command.mjs';
import { SERVICES } from './environment.mjs';
import { root, test } from './paths.mjs';
import { prepare } from './prepare.mjs';
import { explain } from './problem.mjs';
import { oneFailure } from './test-results.mjs';
import { TEST_DIST_DIR, testParts } from './test-parts.mjs';
import { startThrowAwayCluster } from './throw-away-cluster.mjs';

/** No test may reach a real service by way of somebody's shell. */
const withoutServices = () => Object.fromEntries(Object.entries(process.env).filter(([name]) => !SERVICES.includes(name) && name !== 'CARRYOVER_ENV' && name !== 'NODE_ENV'));

/** @param {import('./test-results.mjs').PartResult} result */
const countOf = ({ passed, failed }) => (failed > 0 ? `${passed} passed, ${failed} FAILED` : `${passed} passed`);

/** Everything that proves the project, on a cluster of its own, ending with one line that counts it all. */
export function testEverything() {
  return runCommand(test.run, async (run) => {
    const { steps } = run;
    let passed = 0;
    let failed = 0;

    /**
     * Nothing that goes wrong ends the run: it is counted, said, and the next part has its turn.
     * @param {string} name
     * @param {() => Promise<import('./test-results.mjs').PartResult>} work
     */
    async function count(name, work) {
      const result = await steps.step(name, async (say) => {
        const outcome = await work().catch((error) => {
          return oneFailure(name, explain(error, root));
        });
        // What is stopped half-way proves nothing either way.
        if (run.processes.stopping) throw new Error(`${name} was stopped.`);
        say(countOf(outcome));
        return outcome;
      });
      passed += result.passed;
      failed += result.failed;
      for (const { title, text } of result.failures) steps.line(`\n    FAILED  ${title}\n${text.replace(/^/gm, '      ')}\n`);
    }

    try {
      await prepare(run);
      const cluster = await steps.step('starting a throw-away database cluster', async (say) => {
        const started = await startThrowAwayCluster(run);
        say(`127.0.0.1:${started.port}`);
        return started;
      });
      const env = { ...withoutServices(), CARRYOVER_TEST_CLUSTER: JSON.stringify(cluster), NEXT_DIST_DIR: TEST_DIST_DIR, NEXT_TELEMETRY_DISABLED: '1' };
      for (const { name, run: work } of testParts(run, env)) await count(name, work);
    } catch (error) {
      if (run.processes.stopping) throw error;
      steps.line(`\n${explain(error, root)}`);
      failed += 1;
    }
    steps.line(`\n${passed} passed, ${failed} failed`);
    return failed > 0 ? 1 : 0;
  });
}
