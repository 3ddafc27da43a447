import type { StoreKey, StoreNames, StoreValue } from 'idb';
import { offlineDatabase, type OfflineSchema } from './database';
import { dropKept, makeKept } from './kept-caches';

type Store = StoreNames<OfflineSchema>;

/** In the device's own store: whose keep this is. */
const OWNER = 'user';

/**
 * Notes who uses this device now. Another person's cases are none of theirs; what the other has still to send stays
 * until he or she is back, and shows to nobody.
 */
export async function takeDevice(person: { personId: string; organisationId: string }): Promise<void> {
  const db = await offlineDatabase();
  const mark = `${person.organisationId}/${person.personId}`;
  const held = await db.get('device', OWNER);
  if (held !== undefined && held !== mark) {
    await db.clear('kit');
    await db.clear('edition');
    await dropKept();
  }
  if (held !== mark) await db.put('device', mark, OWNER);
  await makeKept();
}

/** Whether somebody is signed in on this device, as far as it knows. */
export async function isOwned(): Promise<boolean> {
  return (await (await offlineDatabase()).getKey('device', OWNER)) !== undefined;
}

/**
 * Keeps something that the server has too. Owner and keep change in one transaction, so that what was asked for before
 * a sign-out and comes after it leaves nothing here, whichever tab or worker had asked.
 */
export async function keepForOwner<S extends Store>(store: S, value: StoreValue<OfflineSchema, S>, key?: StoreKey<OfflineSchema, S>): Promise<void> {
  const db = await offlineDatabase();
  const tx = db.transaction(['device', store] as Store[], 'readwrite');
  if ((await tx.objectStore('device').getKey(OWNER)) !== undefined) await tx.objectStore(store).put(value as never, key as never);
  await tx.done;
}
