import { listen, type Told } from './bus';
import { onConnection, readConnection } from './connection';

const FIRST_PAUSE_MS = 1_000;

interface Loop {
  stopped: () => boolean;
  /** Something got through: the next pause is short again. */
  progressed: () => void;
}

interface Work {
  /** Of all tabs only the one that holds it sends. */
  lock: string;
  /** What tells that there is something new to send. */
  wakes: Told['kind'];
  longestPauseMs: number;
  /** Sends what it can. @returns whether nothing is left that could be sent; false: it is tried again after a pause */
  sendAll: (loop: Loop) => Promise<boolean>;
}

/**
 * Sends whenever there is reason to think that it works: something new, a connection that is back, a page that comes to
 * the front; and after a pause, each longer than the last, where it did not.
 */
export function startSendLoop({ lock, wakes, longestPauseMs, sendAll }: Work): { stop: () => void } {
  let stopped = false;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let pauseMs = FIRST_PAUSE_MS;
  let running = false;
  let again = false;

  async function kick(): Promise<void> {
    again = true;
    if (running) return;
    running = true;
    while (again && !stopped) {
      again = false;
      clearTimeout(timer);
      const done = await navigator.locks.request(lock, () => sendAll({ stopped: () => stopped, progressed: () => (pauseMs = FIRST_PAUSE_MS) })).catch(() => false);
      if (done) pauseMs = FIRST_PAUSE_MS;
      if (done || again || stopped) continue;
      timer = setTimeout(() => void kick(), pauseMs);
      pauseMs = Math.min(pauseMs * 2, longestPauseMs);
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
  const unlisten = listen(({ kind }) => kind === wakes && void kick());
  // Somebody else's request may be the first to get through again.
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
