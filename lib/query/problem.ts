import { heardFrom } from '@/lib/offline/clock';
import { noteConnection } from '@/lib/offline/connection';

/** What the API answered instead of a result: problem+json (RFC 9457), or no answer at all. */
export class ApiProblem extends Error {
  constructor(
    message: string,
    readonly status: number,
    /** Message by field. */
    readonly fields: Readonly<Record<string, string>> = {},
  ) {
    super(message);
    this.name = 'ApiProblem';
  }
}

/** No answer, or one that may be another in a moment or after signing in again: what was asked may be asked again. */
export const mayPass = ({ status }: ApiProblem) => status === 0 || status === 401 || status === 408 || status === 429 || status >= 500;

const OFFLINE = 'No connection to Carryover. What you entered is still here; try again in a moment.';

/** Reads or writes JSON; throws ApiProblem with words that can be shown. */
export async function api<Result>(path: string, { method = 'GET', body }: { method?: string; body?: unknown } = {}): Promise<Result> {
  let response: Response;
  const askedAt = Date.now();
  try {
    response = await fetch(path, {
      method,
      headers: body === undefined ? {} : { 'content-type': 'application/json' },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
  } catch {
    noteConnection({ reachable: false });
    throw new ApiProblem(OFFLINE, 0);
  }
  heardFrom(response, askedAt);
  noteConnection({ reachable: true, signedOut: response.status === 401 });
  if (response.ok) return (await response.json()) as Result;
  throw await problemOf(response);
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const unknown = `Carryover could not do that (${response.status}). What you entered is still here.`;
  try {
    const { detail, title, errors } = (await response.json()) as { detail?: string; title?: string; errors?: Record<string, string> };
    return new ApiProblem(detail ?? title ?? unknown, response.status, errors);
  } catch {
    return new ApiProblem(unknown, response.status);
  }
}
