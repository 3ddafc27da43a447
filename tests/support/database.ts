import { inject } from 'vitest';
import { copyTemplate } from '@/scripts/lib/throw-away-cluster.mjs';

/**
 * A migrated, empty database of one test file's own on the throw-away cluster: `ownerUrl` for what migrations may do,
 * `appUrl` for what the application may, `superuserUrl` to look past row-level security. Close every connection, then
 * `drop()` it.
 */
export const createTestDatabase = () => copyTemplate(inject('testCluster'), inject('migratedTemplate'));
