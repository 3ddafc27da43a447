import 'server-only';
import { changes } from '@/db';
import type { CaseChange } from '@/db/changes';

/** A stream ends by then and is asked for anew, so that a session that has ended doesn't go on listening. */
const LONGEST_MS = 5 * 60_000;
/** Proxies close what is silent. */
const HEARTBEAT_MS = 20_000;

/**
 * Server-sent events of one case: "changed" whenever it may have been written to. Nothing of the case is in them; it is
 * read with the reader's own rights.
 */
export function caseStream(of: CaseChange, signal: AbortSignal): Response {
  const encoder = new TextEncoder();
  let end: () => void = () => undefined;
  const body = new ReadableStream<Uint8Array>({
    start(controller) {
      const send = (text: string) => {
        try {
          controller.enqueue(encoder.encode(text));
        } catch {
          end();
        }
      };
      const unsubscribe = changes().subscribe(of, () => send('event: changed\ndata: {}\n\n'));
      const heartbeat = setInterval(() => send(': still here\n\n'), HEARTBEAT_MS);
      const limit = setTimeout(() => end(), LONGEST_MS);
      end = () => {
        end = () => undefined;
        unsubscribe();
        clearInterval(heartbeat);
        clearTimeout(limit);
        try {
          controller.close();
        } catch {
          // The reader has gone already.
        }
      };
      signal.addEventListener('abort', () => end());
      send('retry: 1000\nevent: hello\ndata: {}\n\n');
    },
    cancel: () => end(),
  });
  return new Response(body, {
    headers: { 'content-type': 'text/event-stream', 'cache-control': 'private, no-store, no-transform', 'x-accel-buffering': 'no' },
  });
}
