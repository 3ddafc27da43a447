import { ApiProblem, api, mayPass } from '@/lib/query/problem';
import type { CaseState } from '@/lib/schemas/case-view';
import { tell } from './bus';
import { noteConnection } from './connection';
import { startSendLoop } from './send-loop';
import { markRefused, markSent, unsentOf, type Kept } from './waiting';

const LONGEST_PAUSE_MS = 5_000;

const pathOf = (item: Kept): string => {
  const path = `/api/v1/cases/${item.caseId}`;
  if (item.kind === 'finding') return `${path}/findings`;
  if (item.kind === 'acknowledgement') return `${path}/acknowledgements`;
  if (item.kind === 'break-in') return `${path}/break-ins/${item.runId}/events`;
  return `${path}/findings/${item.findingId}/notes`;
};

/**
 * Sends what waits, one after another in the order of doing; of all tabs only one at a time. Each goes by its own id, so
 * that what was sent before its acknowledgement got lost is not written twice.
 */
export function startSender({ personId, organisationId }: { personId: string; organisationId: string }): { stop: () => void } {
  const offline = () => noteConnection({ reachable: false });
  window.addEventListener('offline', offline);
  if (!navigator.onLine) offline();

  const loop = startSendLoop({
    lock: 'carryover-send',
    wakes: 'waiting-changed',
    longestPauseMs: LONGEST_PAUSE_MS,
    async sendAll({ stopped }) {
      for (;;) {
        const [item] = await unsentOf(personId, organisationId);
        if (!item || stopped()) return true;
        try {
          const result = await api<unknown>(pathOf(item), { method: 'POST', body: item.body });
          await markSent(item);
          tell({ kind: 'sent', caseId: item.caseId, id: item.id, state: item.kind === 'finding' ? (result as CaseState) : null });
        } catch (error) {
          if (!(error instanceof ApiProblem)) throw error;
          // The item stays where it is, and so do those behind it: the order is kept.
          if (mayPass(error)) return false;
          await markRefused(item, { message: error.message, fields: { ...error.fields } });
          tell({ kind: 'refused', caseId: item.caseId, id: item.id });
        }
      }
    },
  });

  return {
    stop() {
      loop.stop();
      window.removeEventListener('offline', offline);
    },
  };
}
