import { useEffect, useState, useSyncExternalStore } from 'react';
import { keepStopwatch, onStopwatch, stopwatch } from '@/lib/offline/stopwatches';
import { elapsedMs, IDLE, isRunning, marked, started, stopped, type Stopwatch } from '@/lib/stopwatch';

const SHOWN_EVERY_MS = 100;

export interface StopwatchHandle {
  watch: Stopwatch;
  /** ms, as of the last time it was looked at; undefined where there is none to tell. */
  elapsed: number | undefined;
  start: () => void;
  stop: () => number | undefined;
  mark: (id: string) => void;
  clear: () => void;
}

/** A stopwatch by its name, on this device. It is looked at ten times a second while the page is seen; its time is the clock's. */
export function useStopwatch(name: string): StopwatchHandle {
  const watch = useSyncExternalStore(onStopwatch, () => stopwatch(name), () => IDLE);
  const [now, setNow] = useState(0);
  const running = isRunning(watch);
  useEffect(() => {
    if (!running) return;
    const look = () => setNow(Date.now());
    look();
    const timer = setInterval(look, SHOWN_EVERY_MS);
    document.addEventListener('visibilitychange', look);
    return () => {
      clearInterval(timer);
      document.removeEventListener('visibilitychange', look);
    };
  }, [running]);
  return {
    watch,
    elapsed: elapsedMs(watch, running ? Math.max(now, watch.startedAt ?? 0) : now),
    start: () => keepStopwatch(name, started(Date.now())),
    stop: () => {
      const at = Date.now();
      keepStopwatch(name, stopped(stopwatch(name), at));
      return elapsedMs(stopwatch(name), at);
    },
    mark: (id) => keepStopwatch(name, marked(stopwatch(name), id, Date.now())),
    clear: () => keepStopwatch(name, IDLE),
  };
}
