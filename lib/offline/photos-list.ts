import { ApiProblem, api } from '@/lib/query/problem';
import type { PhotoList } from '@/lib/schemas/photo';

/** Beside the thumbnails, and dropped with them. */
const CACHE = 'carryover-thumbnails';

/** The stored photos of a case; without a connection as they were last told. */
export async function fetchPhotos(caseId: string): Promise<PhotoList> {
  const path = `/api/v1/cases/${caseId}/photos`;
  try {
    const list = await api<PhotoList>(path);
    await keep(path, list);
    return list;
  } catch (error) {
    const kept = error instanceof ApiProblem && error.status === 0 && typeof caches !== 'undefined' ? await (await caches.open(CACHE)).match(path) : undefined;
    if (!kept) throw error;
    return (await kept.json()) as PhotoList;
  }
}

async function keep(path: string, list: PhotoList): Promise<void> {
  if (typeof caches === 'undefined') return;
  // Without room for it, the page does as with a connection.
  await caches.open(CACHE).then((cache) => cache.put(path, Response.json(list))).catch(() => undefined);
}
