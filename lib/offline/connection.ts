/** Whether Carryover can be reached, as far as the last request knew. */
export interface Connection {
  /** false after a request got no answer, or the browser says so; true again after one did. */
  reachable: boolean;
  /** The session has ended: what waits is sent after signing in again. */
  signedOut: boolean;
}

let connection: Connection = { reachable: true, signedOut: false };
const listeners = new Set<() => void>();

export const readConnection = (): Connection => connection;

/** Before there is a browser nothing is known to be wrong. */
const AT_FIRST: Connection = { reachable: true, signedOut: false };
export const connectionAtFirst = (): Connection => AT_FIRST;

export function noteConnection(change: Partial<Connection>): void {
  const next = { ...connection, ...change };
  if (next.reachable === connection.reachable && next.signedOut === connection.signedOut) return;
  connection = next;
  listeners.forEach((listener) => listener());
}

export function onConnection(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
