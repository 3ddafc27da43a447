import pg from 'pg';

export interface CaseChange {
  organisationId: string;
  caseId: string;
}

type Listener = () => void;

export interface CaseChanges {
  /** Calls `listener` after each committed write to the case, and when one may have been missed. @returns a function that ends it */
  subscribe(of: CaseChange, listener: Listener): () => void;
  close(): Promise<void>;
}

const CHANNEL = 'case_changed';
const PAUSES_MS = [100, 500, 2_000];

const keyOf = ({ organisationId, caseId }: CaseChange) => `${organisationId}/${caseId}`;

/** Hears of writes to cases from whichever process made them, over one connection that is opened when it is first needed. */
export function caseChanges(url: string): CaseChanges {
  const listeners = new Map<string, Set<Listener>>();
  let client: pg.Client | undefined;
  let closed = false;

  const tellAll = () => listeners.forEach((group) => group.forEach((listener) => listener()));

  async function connect(attempt = 0): Promise<void> {
    if (closed) return;
    const fresh = new pg.Client({ connectionString: url });
    client = fresh;
    const again = () => {
      if (client !== fresh || closed) return;
      client = undefined;
      setTimeout(() => void connect(attempt + 1), PAUSES_MS[Math.min(attempt, PAUSES_MS.length - 1)]).unref();
    };
    fresh.on('error', () => undefined);
    fresh.on('end', again);
    fresh.on('notification', ({ payload = '' }) => listeners.get(payload.split('/').slice(0, 2).join('/'))?.forEach((listener) => listener()));
    try {
      await fresh.connect();
      await fresh.query(`listen ${CHANNEL}`);
      attempt = 0;
      // What was written while nobody listened is not told again.
      tellAll();
    } catch {
      void fresh.end().catch(() => undefined);
      again();
    }
  }

  return {
    subscribe(of, listener) {
      const key = keyOf(of);
      const group = listeners.get(key) ?? new Set();
      listeners.set(key, group.add(listener));
      if (!client) void connect();
      return () => {
        group.delete(listener);
        if (group.size === 0) listeners.delete(key);
      };
    },
    async close() {
      closed = true;
      await client?.end();
    },
  };
}
