import { AppError, type FieldErrors } from '@/lib/errors';
import { TokenRefused } from './bearer';
import { MalformedBody } from './body';
import { failureOf } from './failure';

/** An error as RFC 9457 has it; `errors` holds the message of each field by its path. */
export interface Problem {
  type: string;
  title: string;
  status: number;
  detail: string;
  errors?: FieldErrors;
  reference?: string;
}

const TITLES: Record<string, string> = {
  'not-signed-in': 'Not signed in',
  forbidden: 'Not allowed',
  'not-found': 'Not found',
  invalid: 'Not valid',
  conflict: 'In conflict with what is stored',
  stale: 'Changed since it was read',
  unconditional: 'Which state is meant is not said',
  'too-many': 'Tried too often',
  'too-large': 'Too large',
  unknown: 'Error on our side',
};

const STALE = 'This was changed since the state that If-Match names. Read it again, and send your change with the ETag that it has now.';

export function problemResponse(error: unknown, doing: string): Response {
  const { code, status, message, fields, reference } = failureOf(error, doing);
  const problem: Problem = {
    type: `urn:carryover:problem:${code}`,
    title: TITLES[code] ?? code,
    status: error instanceof MalformedBody ? 400 : status,
    // A form has what was typed before it; a script has nothing on a screen.
    detail: code === 'stale' ? STALE : message,
    ...(Object.keys(fields).length > 0 && { errors: fields }),
    ...(reference && { reference }),
  };
  return new Response(JSON.stringify(problem), {
    status: problem.status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store', ...challengeOf(error, status) },
  });
}

/** What would be let in, by RFC 6750. Browsers know no sign-in of this kind, and ask nobody anything. */
function challengeOf(error: unknown, status: number): Record<string, string> {
  const refused = error instanceof TokenRefused;
  if (!refused && status !== 401) return {};
  const parts = Object.entries({ realm: 'Carryover', ...(refused && error.challenge) }).map(([name, value]) => `${name}="${value}"`);
  return { 'www-authenticate': `Bearer ${parts.join(', ')}` };
}

/** A cookie goes with any request to us, so a write has to come from a page of ours. */
export function refuseForeignOrigin(request: Request): void {
  const origin = request.headers.get('origin');
  const host = request.headers.get('x-forwarded-host') ?? request.headers.get('host') ?? new URL(request.url).host;
  if (origin !== null && URL.canParse(origin) && new URL(origin).host === host) return;
  throw new AppError('forbidden', 'This request did not come from a page of this application.');
}
