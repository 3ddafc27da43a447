import type { Waiting } from '@/lib/schemas/waiting';
import { tell } from './bus';
import { offlineDatabase } from './database';

/** With its place in the order of doing; `sentAt`: the server has it, and the kit does not yet. */
export type Kept = Waiting & { order: number; sentAt?: number };

/** Keeps something on the device, on the disk when this resolves: what is shown as kept survives an empty battery. */
export async function keepWaiting(waiting: Waiting): Promise<void> {
  const db = await offlineDatabase();
  const tx = db.transaction('waiting', 'readwrite', { durability: 'strict' });
  await tx.store.add(waiting);
  await tx.done;
  tell({ kind: 'waiting-changed', caseId: waiting.caseId });
}

/** Everything of a case that this person has here and that is not in its kit, in the order of doing. */
export async function waitingOf({ caseId, personId }: Pick<Waiting, 'caseId' | 'personId'>): Promise<Kept[]> {
  const db = await offlineDatabase();
  return sorted(await db.getAllFromIndex('waiting', 'case', caseId)).filter((item) => item.personId === personId);
}

/** What has still to be sent by this person, of any case. */
export async function unsentOf(personId: string, organisationId: string): Promise<Kept[]> {
  const db = await offlineDatabase();
  return sorted(await db.getAll('waiting')).filter(
    (item) => item.personId === personId && item.organisationId === organisationId && item.sentAt === undefined && item.refusal === null,
  );
}

export const markSent = (item: Kept) => change(item, { sentAt: Date.now() });

export const markRefused = (item: Kept, refusal: NonNullable<Waiting['refusal']>) => change(item, { refusal });

/** Tries a refused one again: what stood in its way may be gone. */
export const tryAgain = (item: Kept) => change(item, { refusal: null });

/** Changes what is still here: what was discarded meanwhile, or went with a sign-out, doesn't come back. */
async function change({ order, caseId }: Kept, changed: Partial<Pick<Kept, 'sentAt' | 'refusal'>>): Promise<void> {
  const db = await offlineDatabase();
  const tx = db.transaction('waiting', 'readwrite');
  const held = await tx.store.get(order);
  if (held) await tx.store.put({ ...held, ...changed });
  await tx.done;
  tell({ kind: 'waiting-changed', caseId });
}

export async function discard(item: Pick<Kept, 'order' | 'caseId'>): Promise<void> {
  const db = await offlineDatabase();
  await db.delete('waiting', item.order);
  tell({ kind: 'waiting-changed', caseId: item.caseId });
}

/** Takes away what a kit that was asked for after it was sent holds already. */
export async function forgetSent(items: readonly Kept[], askedAt: number): Promise<void> {
  for (const item of items) if (item.sentAt !== undefined && item.sentAt < askedAt) await discard(item);
}

const sorted = (items: Waiting[]): Kept[] => (items as Kept[]).sort((a, b) => a.order - b.order);
