import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import S3rver from 's3rver';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { createStorage, type Storage } from '@/lib/storage';

const folder = mkdtempSync(join(tmpdir(), 'carryover-s3-'));
const server = new S3rver({ address: '127.0.0.1', port: 0, directory: folder, silent: true, configureBuckets: [{ name: 'carryover', configs: [] }] });
let storage: Storage;
beforeAll(async () => {
  const { port } = await server.run();
  // The stand-in knows one pair of keys.
  storage = createStorage({ endpoint: `http://127.0.0.1:${port}`, region: 'us-east-1', bucket: 'carryover', accessKey: 'S3RVER', secretKey: 'S3RVER' });
});
afterAll(async () => {
  await server.close();
  rmSync(folder, { recursive: true });
});

const bytes = new Uint8Array([0, 1, 2, 253, 254, 255]);

test('what is put comes back byte for byte, with its size and type', async () => {
  await storage.put('org/one', bytes, 'image/jpeg');
  expect(Buffer.from((await storage.get('org/one')) ?? [])).toEqual(Buffer.from(bytes));
  expect(await storage.head('org/one')).toEqual({ bytes: 6, mediaType: 'image/jpeg' });
});

test('what is not there is undefined, before and after it is removed', async () => {
  expect([await storage.get('org/none'), await storage.head('org/none')]).toEqual([undefined, undefined]);
  await storage.put('org/two', bytes, 'image/jpeg');
  await storage.remove('org/two');
  expect(await storage.get('org/two')).toBeUndefined();
});

test('a browser uploads and reads by presigned addresses', async () => {
  const { url, fields } = await storage.presignUpload('org/three', { maxBytes: 100, mediaType: 'image/png' });
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.append(name, value);
  form.append('file', new Blob([bytes]));
  expect((await fetch(url, { method: 'POST', body: form })).ok).toBe(true);
  const read = await fetch(await storage.presignRead('org/three'));
  expect(Buffer.from(await read.arrayBuffer())).toEqual(Buffer.from(bytes));
});
