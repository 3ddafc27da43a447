import type { TestProject } from 'vitest/node';
import { build, isBuilt } from '@/scripts/lib/build.mjs';
import { test } from '@/scripts/lib/paths.mjs';
import { processKeeper } from '@/scripts/lib/processes.mjs';
import { seed } from '@/scripts/lib/seed.mjs';
import { TEST_DIST_DIR } from '@/scripts/lib/test-parts.mjs';
import { makeTemplate } from '@/scripts/lib/throw-away-cluster.mjs';
import { ownEnvironment } from '@/tests/e2e/support/own-environment';
import startCluster from '@/tests/support/cluster.global';

declare module 'vitest' {
  export interface ProvidedContext {
    /** The name of a database with the demo organisation in it, to copy. */
    seededTemplate: string;
  }
}

/** A cluster, a production build that fits the sources, and a database with the demo in it to copy. */
export default async function setUp(project: TestProject) {
  const stopCluster = await startCluster(project);
  const processes = processKeeper(test.run);
  const env = ownEnvironment();
  if (!isBuilt(TEST_DIST_DIR)) await build(processes, TEST_DIST_DIR, env);
  const template = await makeTemplate(project.getProvidedContext().testCluster, ({ ownerUrl }) => seed(processes, ownerUrl, env));
  project.provide('seededTemplate', template);
  return async () => {
    await processes.stopAll();
    await stopCluster();
  };
}
