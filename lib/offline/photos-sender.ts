import { ApiProblem } from '@/lib/query/problem';
import { listen } from './bus';
import { onConnection, readConnection } from './connection';
import { changePhoto, photoHere, unsentPhotos } from './photos';
import { sendPhoto } from './photos-send';

const FIRST_PAUSE_MS = 1_000;
const LONGEST_PAUSE_MS = 30_000;

/** No answer, or one that may be another in a moment or after signing in again: the photo goes on waiting. */
const mayPass = ({ status }: ApiProblem) => status === 0 || status === 401 || status === 408 || status === 429 || status >= 500;

/** Sends the photos that wait, one after another; of all tabs only one at a time. */
export function startPhotoSender(person: { personId: string; organisationId: string }): { stop: () => void } {
  let stopped = false;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let pauseMs = FIRST_PAUSE_MS;
  let running = false;
  let again = false;

  /** @returns whether all were sent that could be */
  async function sendAll(): Promise<boolean> {
    let all = true;
    for (const id of await unsentPhotos(person)) {
      const photo = stopped ? undefined : await photoHere(id);
      if (photo?.state !== 'waiting') continue;
      try {
        await sendPhoto(photo);
        pauseMs = FIRST_PAUSE_MS;
      } catch (error) {
        if (!(error instanceof ApiProblem)) throw error;
        if (!mayPass(error)) await changePhoto(id, () => ({ state: 'refused', problem: error.message }));
        else all = false;
        // One that the storage won't take must not keep back the others; without a connection none of them goes.
        if (!readConnection().reachable || readConnection().signedOut) return false;
      }
    }
    return all;
  }

  async function kick(): Promise<void> {
    again = true;
    if (running) return;
    running = true;
    while (again && !stopped) {
      again = false;
      clearTimeout(timer);
      const done = await navigator.locks.request('carryover-photos', sendAll).catch(() => false);
      if (done || again || stopped) continue;
      timer = setTimeout(() => void kick(), pauseMs);
      pauseMs = Math.min(pauseMs * 2, LONGEST_PAUSE_MS);
    }
    running = false;
  }

  const atOnce = () => {
    pauseMs = FIRST_PAUSE_MS;
    void kick();
  };
  const shown = () => document.visibilityState === 'visible' && atOnce();
  window.addEventListener('online', atOnce);
  document.addEventListener('visibilitychange', shown);
  const unlisten = listen(({ kind }) => kind === 'photos-changed' && void kick());
  const unsubscribe = onConnection(() => readConnection().reachable && !readConnection().signedOut && atOnce());
  void kick();

  return {
    stop() {
      stopped = true;
      clearTimeout(timer);
      unlisten();
      unsubscribe();
      window.removeEventListener('online', atOnce);
      document.removeEventListener('visibilitychange', shown);
    },
  };
}
