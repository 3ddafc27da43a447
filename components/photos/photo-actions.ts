import { newId } from '@/lib/ids';
import { changePhoto, dropPhoto, keepPhoto } from '@/lib/offline/photos';
import { api } from '@/lib/query/problem';
import type { Stroke } from '@/lib/schemas/photo';
import type { ShownPhoto } from './shown';

/**
 * Saves what is drawn and written: on the device as long as the photo waits there, else on the server.
 *
 * @returns whether it is the server's now
 */
export async function saveMarks({ id }: ShownPhoto, marks: { strokes: Stroke[]; description: string }): Promise<boolean> {
  const waits = await changePhoto(id, ({ state }) => (state === 'stored' ? undefined : marks)).catch(() => false);
  if (waits) return false;
  await api(`/api/v1/photos/${id}/marks`, { method: 'PUT', body: marks });
  return true;
}

export const setHidden = ({ id }: ShownPhoto, hidden: boolean, reason: string) => api(`/api/v1/photos/${id}/hidden`, { method: 'PUT', body: { hidden, reason } });

/** Tries a refused photo again, as another: the server remembers what it refused. */
export async function tryAgain({ here }: ShownPhoto): Promise<void> {
  if (!here) return;
  await keepPhoto({ ...here, id: newId(), state: 'waiting', problem: null });
  await dropPhoto(here);
}

export const dropHere = async ({ here }: ShownPhoto) => here && dropPhoto(here);
