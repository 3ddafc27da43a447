import type { DevicePhoto } from '@/lib/offline/database';
import { stamp } from '@/lib/offline/clock';
import { keepPhoto } from '@/lib/offline/photos';
import { askPhotoWorker } from '@/lib/offline/photos-worker';
import { newId } from '@/lib/ids';

export type PhotoOwner = Pick<DevicePhoto, 'personId' | 'organisationId' | 'caseId' | 'checkId' | 'place'>;

/**
 * Keeps photos on the device, one after another; a file that is none is left out, and the others go on.
 *
 * @param onDone after each, with why it was left out, if it was
 */
export async function addPhotos(files: readonly File[], owner: PhotoOwner, onDone: (problem: string | null) => void): Promise<void> {
  // Asked for once; browsers that ask people do it now, when it is plain what for.
  void navigator.storage?.persist?.();
  for (const file of files) {
    try {
      const made = await askPhotoWorker(file);
      if (!made.ok) {
        onDone(made.why ?? `“${file.name}” could not be worked on by this browser, so it was left out.`);
        continue;
      }
      const { picture, thumbnail, width, height } = made;
      const { deviceAt, clockOffsetMs } = stamp();
      const takenAt = new Date(Math.min(file.lastModified, Date.parse(deviceAt))).toISOString();
      await keepPhoto({ ...owner, picture, thumbnail, width, height, id: newId(), takenAt, clockOffsetMs, description: '', strokes: [], state: 'waiting', problem: null });
      onDone(null);
    } catch (error) {
      onDone(notKept(error, file));
    }
  }
}

function notKept(error: unknown, file: File): string {
  const name = error instanceof Error || error instanceof DOMException ? error.name : '';
  if (name === 'QuotaExceededError') return `This device has no room left for “${file.name}”. Make room, or wait until the photos before it are sent, then add it again.`;
  return `“${file.name}” could not be kept on this device, so it was left out. A private window keeps nothing; use an ordinary one.`;
}
