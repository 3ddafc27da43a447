import type { TestProject } from 'vitest/node';
import { prepare } from '@/scripts/lib/prepare.mjs';
import { processKeeper } from '@/scripts/lib/processes.mjs';
import { stepPrinter } from '@/scripts/lib/steps.mjs';
import { test } from '@/scripts/lib/paths.mjs';
import { makeTemplate, startThrowAwayCluster, type TestCluster } from '@/scripts/lib/throw-away-cluster.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    testCluster: TestCluster;
    /** The name of a migrated, empty database to copy. */
    migratedTemplate: string;
  }
}

/** Uses the cluster that `npm test` has started, or starts one for this run alone. */
export default async function setUp(project: TestProject) {
  const processes = processKeeper(test.run);
  const run = { processes, steps: stepPrinter() };
  const given = process.env.CARRYOVER_TEST_CLUSTER;
  if (!given) await prepare(run);
  const cluster = given ? (JSON.parse(given) as TestCluster) : await startThrowAwayCluster(run);
  project.provide('testCluster', cluster);
  project.provide('migratedTemplate', await makeTemplate(cluster));
  return () => processes.stopAll();
}
