'use client';

import { useEffect, useState } from 'react';
import { noteConnection } from '@/lib/offline/connection';

/** A stream that hasn't said hello by then is held back by a proxy. */
const HELLO_WITHIN_MS = 4_000;
const REOPEN_AFTER_MS = 3_000;

/**
 * Calls `onChange` whenever a case may have been written to by anybody.
 *
 * @returns whether one has to ask instead, because no stream comes through
 */
export function useCaseEvents(caseId: string, enabled: boolean, onChange: () => void): boolean {
  const [mustAsk, setMustAsk] = useState(false);
  useEffect(() => {
    if (!enabled) return;
    let source: EventSource | undefined;
    let timer: ReturnType<typeof setTimeout> | undefined;

    function open() {
      close();
      // A page in the background holds no connection: browsers allow six to a server.
      if (document.visibilityState === 'hidden') return;
      source = new EventSource(`/api/v1/cases/${caseId}/events`);
      timer = setTimeout(() => setMustAsk(true), HELLO_WITHIN_MS);
      source.addEventListener('hello', () => {
        clearTimeout(timer);
        setMustAsk(false);
        noteConnection({ reachable: true });
        // What happened while nobody listened is not told again.
        onChange();
      });
      source.addEventListener('changed', onChange);
      source.onerror = () => {
        if (source?.readyState !== EventSource.CLOSED) return;
        clearTimeout(timer);
        setMustAsk(true);
        timer = setTimeout(open, REOPEN_AFTER_MS);
      };
    }
    function close() {
      clearTimeout(timer);
      source?.close();
      source = undefined;
    }

    open();
    document.addEventListener('visibilitychange', open);
    window.addEventListener('online', open);
    return () => {
      close();
      document.removeEventListener('visibilitychange', open);
      window.removeEventListener('online', open);
    };
  }, [caseId, enabled, onChange]);
  return mustAsk;
}
