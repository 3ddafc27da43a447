import { IDLE, readStopwatch, type Stopwatch } from '@/lib/stopwatch';

/** Stopwatches lie beside the rest of the device's keep, one a purpose: a reload, or a battery that ends, stops none. */
const PREFIX = 'carryover-stopwatch/';

const watchers = new Set<() => void>();
/** What was read last, so that the same text gives the same stopwatch. */
const read = new Map<string, { text: string | null; watch: Stopwatch }>();

export function stopwatch(name: string): Stopwatch {
  const text = localStorage.getItem(PREFIX + name);
  const held = read.get(name);
  if (held && held.text === text) return held.watch;
  const watch = readStopwatch(text);
  read.set(name, { text, watch });
  return watch;
}

export function keepStopwatch(name: string, watch: Stopwatch): void {
  if (watch === IDLE) localStorage.removeItem(PREFIX + name);
  else localStorage.setItem(PREFIX + name, JSON.stringify(watch));
  watchers.forEach((changed) => changed());
}

/** Hears of changes in this tab and in others. @returns a function that stops listening */
export function onStopwatch(changed: () => void): () => void {
  watchers.add(changed);
  addEventListener('storage', changed);
  return () => {
    watchers.delete(changed);
    removeEventListener('storage', changed);
  };
}

/** Part of signing out. */
export function dropStopwatches(): void {
  for (const key of Object.keys(localStorage)) if (key.startsWith(PREFIX)) localStorage.removeItem(key);
}
