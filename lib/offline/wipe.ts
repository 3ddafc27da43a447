import { offlineDatabase } from './database';
import { dropKept } from './keep-pages';

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

/** Takes everything of Carryover off this device but its built files. */
export async function wipeDevice(): Promise<void> {
  const db = await offlineDatabase().catch(() => undefined);
  if (db) for (const store of ['waiting', 'photo', 'kit', 'edition', 'device'] as const) await db.clear(store);
  await dropKept();
}

/**
 * Notes who uses this device now. Another person's cases are none of theirs; what the other has still to send stays
 * until he or she is back, and shows to nobody.
 */
export async function takeDevice(person: { personId: string; organisationId: string }): Promise<void> {
  const db = await offlineDatabase();
  const mark = `${person.organisationId}/${person.personId}`;
  const held = await db.get('device', 'user');
  if (held === mark) return;
  if (held !== undefined) {
    await db.clear('kit');
    await db.clear('edition');
    await dropKept();
  }
  await db.put('device', mark, 'user');
}
