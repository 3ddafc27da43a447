import { connect, type Database } from '@/db/connect';
import { createTestDatabase } from './database';

export interface TestDatabases {
  /** As the application reaches it: under row-level security, with the application's rights. */
  app: Database;
  /** As migrations and seeds do. Forced row-level security holds for it too: set the organisation. */
  owner: Database;
  appUrl: string;
  ownerUrl: string;
  /** Closes the connections and drops the database. */
  close(): Promise<void>;
}

/** An empty, migrated database of one test file's own: open it in `beforeAll`, close it in `afterAll`. */
export async function openTestDatabases(): Promise<TestDatabases> {
  const database = await createTestDatabase();
  const app = connect(database.appUrl, { max: 5 });
  const owner = connect(database.ownerUrl, { max: 2 });
  return {
    app: app.db,
    owner: owner.db,
    appUrl: database.appUrl,
    ownerUrl: database.ownerUrl,
    async close() {
      await Promise.all([app.close(), owner.close()]);
      await database.drop();
    },
  };
}
