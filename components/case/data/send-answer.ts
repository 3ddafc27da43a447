import type { QueryClient } from '@tanstack/react-query';
import { listen } from '@/lib/offline/bus';
import { readConnection } from '@/lib/offline/connection';
import { askRanker } from '@/lib/offline/ranker';
import { discard, keepWaiting, waitingOf } from '@/lib/offline/waiting';
import { ApiProblem, api } from '@/lib/query/problem';
import type { AnswerInput } from '@/lib/schemas/case';
import type { Waiting } from '@/lib/schemas/waiting';
import { provisionalOptions } from './use-provisional';

/** After this long without the server's word the device goes on by itself. */
export const PATIENCE_MS = 600;

/** Refuses at once what can't be understood, as far as the device can tell. */
export async function refuseUnreadable(caseId: string, checkId: string, answer: AnswerInput): Promise<void> {
  if (answer.kind !== 'measured' && answer.kind !== 'sum') return;
  const read = await askRanker({ kind: 'read', caseId, checkId, answer });
  if (read.kind === 'refused') throw new ApiProblem(read.message, 422, read.fields);
}

/**
 * Keeps an answer on the device, and resolves when the page can go on: the server has it, or the device has ranked by
 * itself because the server can't be reached.
 *
 * @throws ApiProblem when the server would not take it: nothing of it is kept then, since the person still has it at hand
 */
export async function keepAndSend(client: QueryClient, waiting: Waiting, path: string): Promise<void> {
  const word = wordOn(waiting.id);
  try {
    await keepWaiting(waiting);
  } catch {
    // A browser without a keep of its own: then there is only the server.
    word.cancel();
    await api(path, { method: 'POST', body: waiting.body });
    return;
  }
  const heard = readConnection().reachable ? await Promise.race([word.heard, pause(PATIENCE_MS)]) : undefined;
  word.cancel();
  if (heard === 'sent') return;
  const items = await waitingOf(waiting);
  if (heard === 'refused') {
    const item = items.find(({ id }) => id === waiting.id);
    if (item?.refusal) {
      await discard(item);
      throw new ApiProblem(item.refusal.message, 422, item.refusal.fields);
    }
  }
  await client.fetchQuery(provisionalOptions(waiting.caseId, items)).catch(() => undefined);
}

const pause = (ms: number) => new Promise<undefined>((resolve) => setTimeout(resolve, ms, undefined));

function wordOn(id: string) {
  let cancel: () => void = () => undefined;
  const heard = new Promise<'sent' | 'refused'>((resolve) => {
    cancel = listen((told) => {
      if ((told.kind === 'sent' || told.kind === 'refused') && told.id === id) resolve(told.kind);
    });
  });
  return { heard, cancel: () => cancel() };
}
