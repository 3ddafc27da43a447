import { ApiProblem, api } from '@/lib/query/problem';
import type { CaseState } from '@/lib/schemas/case-view';
import { listen, tell } from './bus';
import { noteConnection, onConnection, readConnection } from './connection';
import { markRefused, markSent, unsentOf, type Kept } from './waiting';

const FIRST_PAUSE_MS = 1_000;
const LONGEST_PAUSE_MS = 5_000;

const pathOf = (item: Kept): string => {
  const path = `/api/v1/cases/${item.caseId}`;
  if (item.kind === 'finding') return `${path}/findings`;
  if (item.kind === 'acknowledgement') return `${path}/acknowledgements`;
  return `${path}/findings/${item.findingId}/notes`;
};

/** No answer, or one that may be another in a moment: the item stays where it is. */
const mayPass = ({ status }: ApiProblem) => status === 0 || status === 401 || status === 408 || status === 429 || status >= 500;

/**
 * Sends what waits, one after another in the order of doing; of all tabs only one at a time. Each goes by its own id, so
 * that what was sent before its acknowledgement got lost is not written twice.
 */
export function startSender({ personId, organisationId }: { personId: string; organisationId: string }) {
  let stopped = false;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let pauseMs = FIRST_PAUSE_MS;

  /** @returns whether nothing is left that could be sent */
  async function sendAll(): Promise<boolean> {
    for (;;) {
      const [item] = await unsentOf(personId, organisationId);
      if (!item || stopped) return true;
      try {
        const result = await api<unknown>(pathOf(item), { method: 'POST', body: item.body });
        await markSent(item);
        tell({ kind: 'sent', caseId: item.caseId, id: item.id, state: item.kind === 'finding' ? (result as CaseState) : null });
      } catch (error) {
        if (!(error instanceof ApiProblem)) throw error;
        if (mayPass(error)) return false;
        await markRefused(item, { message: error.message, fields: { ...error.fields } });
        tell({ kind: 'refused', caseId: item.caseId, id: item.id });
      }
    }
  }

  async function run(): Promise<void> {
    clearTimeout(timer);
    if (stopped) return;
    const done = await navigator.locks.request('carryover-send', sendAll).catch(() => false);
    if (done || stopped) {
      pauseMs = FIRST_PAUSE_MS;
      return;
    }
    timer = setTimeout(kick, pauseMs);
    pauseMs = Math.min(pauseMs * 2, LONGEST_PAUSE_MS);
  }

  let running: Promise<void> | undefined;
  let again = false;
  function kick(): void {
    if (running) {
      again = true;
      return;
    }
    running = run().finally(() => {
      running = undefined;
      if (again) {
        again = false;
        kick();
      }
    });
  }

  const online = () => {
    pauseMs = FIRST_PAUSE_MS;
    kick();
  };
  const offline = () => noteConnection({ reachable: false });
  const shown = () => document.visibilityState === 'visible' && online();
  window.addEventListener('online', online);
  window.addEventListener('offline', offline);
  document.addEventListener('visibilitychange', shown);
  const unlisten = listen(({ kind }) => kind === 'waiting-changed' && kick());
  // Somebody else's request may be the first to get through again.
  const unsubscribe = onConnection(() => readConnection().reachable && online());
  if (!navigator.onLine) offline();
  kick();

  return {
    kick,
    stop() {
      stopped = true;
      clearTimeout(timer);
      unlisten();
      unsubscribe();
      window.removeEventListener('online', online);
      window.removeEventListener('offline', offline);
      document.removeEventListener('visibilitychange', shown);
    },
  };
}

export type Sender = ReturnType<typeof startSender>;
