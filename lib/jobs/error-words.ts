/** What pg-boss keeps of a job that failed. */
const LOST = 'job failed by timeout in active state';
const TOO_LONG = /^handler execution exceeded/;
const NEUTRAL = 'Something went wrong inside Carryover. Its log says what.';
const MOST_CHARACTERS = 200;

const textOf = (value: unknown, key: string): unknown => (typeof value === 'object' && value !== null && key in value ? (value as Record<string, unknown>)[key] : undefined);

/**
 * The error of a job in words: the first line of its message, and nothing of a stack, a statement or a value in one.
 *
 * @param output as pg-boss keeps it: an error taken apart, or a value with a message in it
 * @param isShared seen by every organisation, so that its words could be somebody else's
 */
export function jobErrorWords(output: unknown, { isShared = false }: { isShared?: boolean } = {}): string | null {
  if (output === null || output === undefined) return null;
  const message = textOf(output, 'message') ?? textOf(textOf(output, 'value'), 'message');
  if (typeof message !== 'string') return NEUTRAL;
  if (message === LOST) return 'Its worker was stopped while it ran.';
  if (TOO_LONG.test(message)) return 'It took longer than it may.';
  if (isShared || isOfDatabase(output, message)) return NEUTRAL;
  return message.split(/[\r\n]/, 1)[0]?.trim().slice(0, MOST_CHARACTERS) || NEUTRAL;
}

/** Five characters are a code of PostgreSQL's, whose messages quote what was to be written. */
const isOfDatabase = (output: unknown, message: string): boolean => {
  const code = textOf(output, 'code') ?? textOf(textOf(output, 'cause'), 'code');
  return /^failed query/i.test(message) || (typeof code === 'string' && /^[0-9A-Z]{5}$/.test(code));
};
