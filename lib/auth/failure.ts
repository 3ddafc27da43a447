import { unstable_rethrow } from 'next/navigation';
import { AppError, type ErrorCode, type FieldErrors } from '@/lib/errors';
import { log } from '@/lib/log';

export interface Failure {
  code: ErrorCode | 'unknown';
  status: number;
  message: string;
  fields: FieldErrors;
  /** Names the log entry of an error that is ours. */
  reference?: string;
}

const STATUS: Record<ErrorCode, number> = {
  'not-signed-in': 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  stale: 412,
  'too-large': 413,
  invalid: 422,
  unconditional: 428,
  'too-many': 429,
};

/**
 * What to tell somebody about an error. Ours tell their own message; of any other only a reference gets out, under
 * which the log has the rest. Redirects and the like, which Next throws, pass through.
 */
export function failureOf(error: unknown, doing: string): Failure {
  unstable_rethrow(error);
  if (error instanceof AppError) return { code: error.code, status: STATUS[error.code], message: error.message, fields: error.fields };
  const reference = crypto.randomUUID().slice(0, 8);
  log.error({ err: error, cause: error instanceof Error ? error.cause : undefined, reference }, `${doing} failed`);
  return {
    code: 'unknown',
    status: 500,
    message: `Something went wrong on our side, and nothing was saved. Try again; if it happens again, report reference ${reference}.`,
    fields: {},
    reference,
  };
}
