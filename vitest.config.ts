import { defineConfig } from 'vitest/config';
import { fileURLToPath } from 'node:url';

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

/**
 * One project for each kind of proof, so that `vitest run --project unit` stays fast and needs no database.
 * `server-only` throws outside a server bundle; here it is an empty file.
 */
export default defineConfig({
  resolve: { alias: { '@': here('.'), 'server-only': here('./tests/support/empty.ts') } },
  test: {
    projects: [
      { extends: true, test: { name: 'unit', include: ['tests/unit/**/*.test.{ts,tsx}'] } },
      { extends: true, test: { name: 'golden', include: ['tests/golden/**/*.test.ts'], testTimeout: 120_000 } },
      { extends: true, test: { name: 'checks', include: ['tests/checks/**/*.test.ts'], testTimeout: 60_000 } },
      {
        extends: true,
        test: {
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          globalSetup: ['tests/support/cluster.global.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        extends: true,
        // Hundreds of workers begin and die: nothing else should wait for the machine meanwhile.
        test: { name: 'kills', include: ['tests/kills/**/*.test.ts'], globalSetup: ['tests/support/cluster.global.ts'] },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/e2e/support/seeded.global.ts'],
          // Each file has a server, a worker and a browser of its own.
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
          // What a page comes to is right or wrong, however busy the machine is.
          expect: { poll: { timeout: 15_000 } },
        },
      },
    ],
  },
});
