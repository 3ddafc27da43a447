import { ApiProblem, api } from '@/lib/query/problem';
import type { PhotoList } from '@/lib/schemas/photo';
import { matchKept, putKept } from './kept-caches';

/** The stored photos of a case; without a connection as they were last told, kept beside their thumbnails. */
export async function fetchPhotos(caseId: string): Promise<PhotoList> {
  const path = `/api/v1/cases/${caseId}/photos`;
  try {
    const list = await api<PhotoList>(path);
    // Without room for it, the page does as with a connection.
    await putKept('thumbnails', path, Response.json(list)).catch(() => undefined);
    return list;
  } catch (error) {
    const kept = error instanceof ApiProblem && error.status === 0 ? await matchKept('thumbnails', path) : undefined;
    if (!kept) throw error;
    return (await kept.json()) as PhotoList;
  }
}
