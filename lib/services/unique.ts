import type { AppError } from '@/lib/errors';

const UNIQUE_VIOLATION = '23505';

/** Drizzle wraps what the driver threw. */
function violated(error: unknown): string | undefined {
  const cause = error instanceof Error ? error.cause : undefined;
  if (typeof cause !== 'object' || cause === null || !('code' in cause) || cause.code !== UNIQUE_VIOLATION) return undefined;
  return 'constraint' in cause && typeof cause.constraint === 'string' ? cause.constraint : '';
}

/**
 * Runs a write that a unique constraint may refuse, and says it in words when it does. Asking first would let two
 * requests at once both be told that a name is free.
 */
export async function orTaken<T>(constraint: string, taken: () => AppError, write: Promise<T>): Promise<T> {
  try {
    return await write;
  } catch (error) {
    throw violated(error) === constraint ? taken() : error;
  }
}
