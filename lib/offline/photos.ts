import { tell } from './bus';
import { offlineDatabase, type DevicePhoto } from './database';

/** Keeps a photo on the device, on the disk when this resolves: until it is sent, it is the only copy there is. */
export async function keepPhoto(photo: DevicePhoto): Promise<void> {
  const db = await offlineDatabase();
  const tx = db.transaction('photo', 'readwrite', { durability: 'strict' });
  await tx.store.put(photo);
  await tx.done;
  tell({ kind: 'photos-changed', caseId: photo.caseId });
}

/** What this person has on this device of a case, as it was taken. */
export async function photosHere({ caseId, personId }: Pick<DevicePhoto, 'caseId' | 'personId'>): Promise<DevicePhoto[]> {
  const db = await offlineDatabase();
  return inOrder(await db.getAllFromIndex('photo', 'case', caseId)).filter((photo) => photo.personId === personId);
}

/** The ids of what this person has still to send, of any case; ids, because pictures are large. */
export async function unsentPhotos({ personId, organisationId }: Pick<DevicePhoto, 'personId' | 'organisationId'>): Promise<string[]> {
  const db = await offlineDatabase();
  return inOrder(await db.getAll('photo'))
    .filter((photo) => photo.personId === personId && photo.organisationId === organisationId && photo.state === 'waiting')
    .map(({ id }) => id);
}

export const photoHere = async (id: string): Promise<DevicePhoto | undefined> => (await offlineDatabase()).get('photo', id);

/**
 * Changes a photo that is here, by what it is at that moment: another tab may have changed it, too.
 *
 * @param change what to change of it; undefined leaves it as it is
 * @returns whether it was changed
 */
export async function changePhoto(id: string, change: (held: DevicePhoto) => Partial<DevicePhoto> | undefined): Promise<boolean> {
  const db = await offlineDatabase();
  const tx = db.transaction('photo', 'readwrite', { durability: 'strict' });
  const held = await tx.store.get(id);
  const changed = held && change(held);
  if (held && changed) await tx.store.put({ ...held, ...changed });
  await tx.done;
  if (held && changed) tell({ kind: 'photos-changed', caseId: held.caseId });
  return changed !== undefined;
}

export async function dropPhoto({ id, caseId }: Pick<DevicePhoto, 'id' | 'caseId'>): Promise<void> {
  const db = await offlineDatabase();
  await db.delete('photo', id);
  tell({ kind: 'photos-changed', caseId });
}

const inOrder = (photos: DevicePhoto[]) => photos.sort((a, b) => (a.takenAt === b.takenAt ? (a.id < b.id ? -1 : 1) : a.takenAt < b.takenAt ? -1 : 1));
