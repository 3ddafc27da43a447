/** How much of each photo that is being sent has gone, from 0 to 1, by its id. */
type Progress = ReadonlyMap<string, number>;

let progress: Progress = new Map();
const listeners = new Set<() => void>();
const NONE: Progress = new Map();

export const readProgress = (): Progress => progress;
export const progressAtFirst = (): Progress => NONE;

/** @param share undefined: it is not being sent any more */
export function noteProgress(id: string, share: number | undefined): void {
  const next = new Map(progress);
  if (share === undefined) next.delete(id);
  else next.set(id, share);
  progress = next;
  listeners.forEach((listener) => listener());
}

export function onProgress(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
