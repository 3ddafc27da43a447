import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import S3rver from 's3rver';
import { createStorage, type Storage, type StorageSettings } from '@/lib/storage';

const BUCKET = 'carryover';

export interface TestStorage {
  storage: Storage;
  settings: StorageSettings;
  close(): Promise<void>;
}

/** A storage of one test file's own, behind a real server. */
export async function openTestStorage(): Promise<TestStorage> {
  const folder = mkdtempSync(join(tmpdir(), 'carryover-s3-'));
  const server = new S3rver({ address: '127.0.0.1', port: 0, directory: folder, silent: true, configureBuckets: [{ name: BUCKET, configs: [] }] });
  const { port } = await server.run();
  // The stand-in knows one pair of keys.
  const settings = { endpoint: `http://127.0.0.1:${port}`, region: 'us-east-1', bucket: BUCKET, accessKey: 'S3RVER', secretKey: 'S3RVER' };
  return {
    storage: createStorage(settings),
    settings,
    async close() {
      await server.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
