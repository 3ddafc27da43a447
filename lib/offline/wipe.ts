import { offlineDatabase } from './database';
import { dropKept } from './kept-caches';
import { dropStopwatches } from './stopwatches';

/** How much would be lost with this device's keep: answers and photos that the server hasn't got. */
export async function unsentCount(): Promise<number> {
  try {
    const db = await offlineDatabase();
    const waiting = (await db.getAll('waiting')).filter((item) => !('sentAt' in item && item.sentAt));
    const photos = (await db.getAll('photo')).filter(({ state }) => state === 'waiting');
    return waiting.length + photos.length;
  } catch {
    return 0;
  }
}

/** Takes everything of Carryover off this device but its built files, at once: nothing is written between one store and the next. */
export async function wipeDevice(): Promise<void> {
  const db = await offlineDatabase().catch(() => undefined);
  if (db) {
    const tx = db.transaction(db.objectStoreNames, 'readwrite');
    await Promise.all([...db.objectStoreNames].map((name) => tx.objectStore(name).clear()));
    await tx.done;
  }
  dropStopwatches();
  await dropKept();
}
