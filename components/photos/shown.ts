import type { DevicePhoto } from '@/lib/offline/database';
import type { PhotoView } from '@/lib/schemas/photo';

/** A photo on the page: stored on the server, or on this device alone. */
export interface ShownPhoto extends Omit<PhotoView, 'person'> {
  /** null: whoever looks at it. */
  person: string | null;
  /** What is on this device; null once the server has it. */
  here: DevicePhoto | null;
}

/** What is stored, with what this device still has for itself, in the order in which it was taken. */
export function shownPhotos(stored: readonly PhotoView[], here: readonly DevicePhoto[]): ShownPhoto[] {
  const known = new Set(stored.map(({ id }) => id));
  const own = here
    .filter(({ id }) => !known.has(id))
    .map((photo): ShownPhoto => {
      const { id, caseId, checkId, place = null, width, height, takenAt, description, strokes } = photo;
      return { id, caseId, checkId, place, width, height, takenAt, description, strokes, person: null, hidden: null, here: photo };
    });
  return [...stored.map((photo): ShownPhoto => ({ ...photo, here: null })), ...own].sort((a, b) => Date.parse(a.takenAt) - Date.parse(b.takenAt));
}

/** Where a photo stands, in words; null when there is nothing to say: it is stored. */
export function standingOf({ here }: ShownPhoto, share: number | undefined): string | null {
  if (!here || here.state === 'stored') return null;
  if (here.state === 'refused') return `Refused: ${here.problem ?? 'the server did not say why.'}`;
  return share === undefined ? 'Waits' : `Being sent, ${Math.round(share * 100)} %`;
}
