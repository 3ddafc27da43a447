import { useSyncExternalStore } from 'react';

/** Kept on this device: who dictates, or types with one finger, turns keys that work by themselves off. */
const OFF = 'list-keys-off';

const watchers = new Set<() => void>();

export const singleKeysAreOff = () => localStorage.getItem(OFF) === 'yes';

function watch(changed: () => void): () => void {
  watchers.add(changed);
  return () => watchers.delete(changed);
}

export function turnSingleKeys(off: boolean): void {
  if (off) localStorage.setItem(OFF, 'yes');
  else localStorage.removeItem(OFF);
  for (const changed of watchers) changed();
}

/** Whether they are off; the server that drew the page can't know. */
export const useSingleKeysAreOff = () => useSyncExternalStore(watch, singleKeysAreOff, () => false);

/** Whether a key belongs to the field that has the focus. */
export const isTyping = (target: EventTarget | null) => target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|SELECT|TEXTAREA)$/.test(target.tagName));
