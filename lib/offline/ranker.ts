import type { ParsedAnswer } from '@/lib/case/read-answer';
import type { CaseReasons, CaseState } from '@/lib/schemas/case-view';

export type RankerQuestion =
  | { kind: 'state'; caseId: string }
  /** Keep your own files where the service worker finds them. */
  | { kind: 'keep' }
  /** Can this be understood as an answer? */
  | { kind: 'read'; caseId: string; checkId: string; answer: ParsedAnswer };

export interface RankerAnswer {
  id: number;
  result:
    | { kind: 'state'; kitVersion: number; state: CaseState; reasons: CaseReasons }
    | { kind: 'fine' }
    | { kind: 'refused'; message: string; fields: Record<string, string> }
    /** The device has not got what it takes: the server has to say. */
    | { kind: 'unready' }
    | { kind: 'failed'; message: string };
}

let worker: Worker | undefined;
let count = 0;
const asked = new Map<number, (result: RankerAnswer['result']) => void>();

/** The compiled rulebook runs in a worker of its own: ranking never makes a tap wait, and no page loads it at first. */
function start(): Worker {
  if (worker) return worker;
  worker = new Worker(new URL('./ranker.worker.ts', import.meta.url), { type: 'module' });
  worker.onmessage = ({ data }: MessageEvent<RankerAnswer>) => {
    asked.get(data.id)?.(data.result);
    asked.delete(data.id);
  };
  worker.onerror = () => {
    for (const answer of asked.values()) answer({ kind: 'failed', message: 'The ranker on this device stopped.' });
    asked.clear();
    worker = undefined;
  };
  return worker;
}

/** Has it ready before it is needed: without a connection it could not be fetched. */
export const warmRanker = () => void start();

export function askRanker(question: RankerQuestion): Promise<RankerAnswer['result']> {
  return new Promise((resolve) => {
    const id = (count += 1);
    asked.set(id, resolve);
    start().postMessage({ id, question });
  });
}
