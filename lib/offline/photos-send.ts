import { ApiProblem, api } from '@/lib/query/problem';
import type { PhotoStanding, Stroke } from '@/lib/schemas/photo';
import type { DevicePhoto } from './database';
import { changePhoto, photoHere } from './photos';
import { noteProgress } from './photos-progress';

/** A photo of half a megabyte takes as long on the poorest connection that is one at all. */
const LONGEST_UPLOAD_MS = 180_000;

interface Marks {
  strokes: Stroke[];
  description: string;
}
const isSame = (a: Marks, b: Marks) => a.description === b.description && JSON.stringify(a.strokes) === JSON.stringify(b.strokes);

/**
 * Sends one photo: announces it, uploads it, says so, and sends what is drawn on it. Its own id is the key, so that each
 * step may be done again after a cut.
 *
 * @throws ApiProblem
 */
export async function sendPhoto(photo: DevicePhoto): Promise<void> {
  const { id, caseId, checkId, place = null, picture, takenAt, clockOffsetMs } = photo;
  noteProgress(id, 0);
  try {
    const announced = await api<PhotoStanding>(`/api/v1/cases/${caseId}/photos`, {
      method: 'POST',
      body: { id, checkId, place, mediaType: picture.type, bytes: picture.size, takenAt, clockOffsetMs },
    });
    if (announced.upload) await upload(announced.upload, picture, (share) => noteProgress(id, share));
    const { state, refusal } = announced.state === 'awaited' ? await sayArrived(id) : announced;
    if (state === 'refused') {
      await changePhoto(id, () => ({ state: 'refused', problem: refusal }));
      return;
    }
    await sendMarks(id);
  } finally {
    noteProgress(id, undefined);
  }
}

/** Part of it, or none, is no refusal: it is uploaded again. */
async function sayArrived(id: string): Promise<PhotoStanding> {
  try {
    return await api<PhotoStanding>(`/api/v1/photos/${id}/arrived`, { method: 'POST', body: {} });
  } catch (error) {
    throw error instanceof ApiProblem && error.status === 409 ? new ApiProblem(error.message, 0) : error;
  }
}

/** Until what the server has is what is on the device: somebody may draw on while it is being sent. */
async function sendMarks(id: string): Promise<void> {
  let sent: Marks = { strokes: [], description: '' };
  for (;;) {
    const held = await photoHere(id);
    if (!held) return;
    const { strokes, description } = held;
    if (!isSame(held, sent)) await api(`/api/v1/photos/${id}/marks`, { method: 'PUT', body: { strokes, description } });
    sent = { strokes, description };
    if (await changePhoto(id, (now) => (isSame(now, sent) ? { state: 'stored' } : undefined))) return;
  }
}

/** By the older kind of request: the newer can't tell how far it is. */
function upload({ url, fields }: NonNullable<PhotoStanding['upload']>, picture: Blob, onShare: (share: number) => void): Promise<void> {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.append(name, value);
  form.append('file', picture);
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    const failed = () => reject(new ApiProblem('The photo could not be uploaded. It is still here, and is sent again in a moment.', 0));
    request.open('POST', url);
    request.timeout = LONGEST_UPLOAD_MS;
    request.upload.onprogress = ({ loaded, total }) => onShare(total > 0 ? loaded / total : 0);
    request.onload = () => (request.status >= 200 && request.status < 300 ? resolve() : failed());
    request.onerror = request.ontimeout = request.onabort = failed;
    request.send(form);
  });
}
