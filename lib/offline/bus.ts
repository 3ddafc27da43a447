import type { CaseState } from '@/lib/schemas/case-view';

/** What tabs of one browser tell each other. */
export type Told =
  | { kind: 'waiting-changed'; caseId: string }
  | { kind: 'photos-changed'; caseId: string }
  | { kind: 'kit-changed'; caseId: string }
  /** The server has it; a finding is answered with the case's new state. */
  | { kind: 'sent'; caseId: string; id: string; state: CaseState | null }
  | { kind: 'refused'; caseId: string; id: string };

type Listener = (told: Told) => void;

const listeners = new Set<Listener>();
let channel: BroadcastChannel | undefined;

function open(): BroadcastChannel | undefined {
  if (channel || typeof BroadcastChannel === 'undefined') return channel;
  channel = new BroadcastChannel('carryover');
  channel.onmessage = ({ data }: MessageEvent<Told>) => listeners.forEach((listener) => listener(data));
  return channel;
}

/** Tells every tab, this one included. */
export function tell(told: Told): void {
  listeners.forEach((listener) => listener(told));
  open()?.postMessage(told);
}

/** @returns a function that stops listening */
export function listen(listener: Listener): () => void {
  open();
  listeners.add(listener);
  return () => listeners.delete(listener);
}
