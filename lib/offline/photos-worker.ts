import type { PreparedPhoto } from './photos-prepare';

export interface PhotoWanted {
  id: number;
  file: File;
}

export interface PhotoMade {
  id: number;
  /** `why` is null where nobody foresaw it. */
  made: ({ ok: true } & PreparedPhoto) | { ok: false; why: string | null };
}

let worker: Worker | undefined;
let count = 0;
const asked = new Map<number, (made: PhotoMade['made']) => void>();

/** Pictures are decoded and drawn in a worker of their own, so that a tap on the page never waits for one. */
function start(): Worker {
  if (worker) return worker;
  worker = new Worker(new URL('./photos-prepare.worker.ts', import.meta.url), { type: 'module' });
  worker.onmessage = ({ data: { id, made } }: MessageEvent<PhotoMade>) => {
    asked.get(id)?.(made);
    asked.delete(id);
  };
  worker.onerror = () => {
    for (const answer of asked.values()) answer({ ok: false, why: null });
    asked.clear();
    worker = undefined;
  };
  return worker;
}

/** Has it ready before it is needed: without a connection it could not be fetched. */
export const warmPhotoWorker = () => void start();

/** What is sent of a file that somebody chose, or why it is no photo. */
export function askPhotoWorker(file: File): Promise<PhotoMade['made']> {
  return new Promise((resolve) => {
    const id = (count += 1);
    asked.set(id, resolve);
    start().postMessage({ id, file } satisfies PhotoWanted);
  });
}
