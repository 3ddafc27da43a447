import { NextRequest } from 'next/server';
import { DescribedAnswers } from '@/tests/support/described';
import type { Browser } from '@/tests/support/next-request';
import { load } from './find-routes';
import type { ActionRow, FormFields, Made, PageRow, Query, RouteRow, Row } from './row';

/** What came of a try, whichever kind of thing was tried. */
export interface Outcome {
  /** refused: in words that somebody can act on; broken: an error of ours, which never may be. */
  kind: 'done' | 'refused' | 'broken';
  /** Of the three, where HTTP has a status for it; actions have none. */
  status?: number;
  redirect?: string;
  message: string;
  /** All text of what was answered, to look for what must not be in it. */
  text: string;
}

/** What to give instead of what the row gives. */
export interface Change {
  params?: Record<string, string | string[]>;
  query?: Query;
  /** Fields over those of the form; or something that is no form at all. */
  form?: { fields: FormFields } | { notAForm: unknown };
  body?: string;
  headers?: Record<string, string>;
}

/** Every string in a value, elements of a page included. */
function textsIn(value: unknown, seen = new Set<unknown>()): string[] {
  if (typeof value === 'string') return [value];
  if (typeof value !== 'object' || value === null || seen.has(value)) return [];
  seen.add(value);
  // What React keeps beside an element (its owner, its stack) is no part of the page.
  return Object.entries(value).filter(([key]) => !key.startsWith('_')).flatMap(([, inner]) => textsIn(inner, seen));
}

/** Redirects and not-found are thrown by Next's functions; anything else thrown is an error of ours. */
function outcomeOfThrown(error: unknown): Outcome {
  const digest = typeof error === 'object' && error !== null && 'digest' in error ? String(error.digest) : '';
  const [kind, , to] = digest.split(';');
  if (kind === 'NEXT_REDIRECT') return { kind: 'done', redirect: to, status: 307, message: '', text: '' };
  if (kind === 'NEXT_HTTP_ERROR_FALLBACK') return { kind: 'refused', status: Number(digest.split(';')[1]), message: 'not found', text: '' };
  return { kind: 'broken', message: error instanceof Error ? `${error.name}: ${error.message} ${String(error.cause ?? '')}` : String(error), text: '' };
}

async function tryPage(row: PageRow<Made>, made: Made, browser: Browser, change: Change): Promise<Outcome> {
  const { default: Page } = (await load(`${row.page}/page.tsx`)) as { default: (props: unknown) => unknown };
  const params = Promise.resolve(change.params ?? row.params?.(made) ?? {});
  const searchParams = Promise.resolve(change.query ?? row.query?.(made) ?? {});
  try {
    const element = await browser.render(`/${row.page}`, async () => Page({ params, searchParams }));
    return { kind: 'done', status: 200, message: '', text: textsIn(element).join('\n') };
  } catch (error) {
    return outcomeOfThrown(error);
  }
}

function formOf(fields: FormFields): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) for (const one of [value].flat()) form.append(name, one);
  return form;
}

async function tryAction(row: ActionRow<Made>, made: Made, browser: Browser, change: Change): Promise<Outcome> {
  const act = (await load(`${row.action === '.' ? '' : `${row.action}/`}actions.ts`))[row.name] as (...args: unknown[]) => Promise<unknown>;
  const form = change.form && 'notAForm' in change.form ? change.form.notAForm : formOf({ ...row.form(made), ...change.form?.fields });
  try {
    const state = await browser.act(`/${row.action}`, () => (row.isPlain ? act(form) : act(null, form)));
    const answer = state as { ok: boolean; message?: string; reference?: string; fields?: object };
    if (answer.ok) return { kind: 'done', message: '', text: textsIn(answer).join('\n') };
    return { kind: answer.reference ? 'broken' : 'refused', message: `${answer.message} ${JSON.stringify(answer.fields)}`, text: textsIn(answer).join('\n') };
  } catch (error) {
    return outcomeOfThrown(error);
  }
}

/** All of an answer; of a stream that goes on, what it says at once. */
async function textOf(response: Response): Promise<string> {
  if (!response.headers.get('content-type')?.startsWith('text/event-stream')) return response.text();
  const reader = response.body?.getReader();
  const first = await reader?.read();
  await reader?.cancel();
  return new TextDecoder().decode(first?.value);
}

let described: Promise<DescribedAnswers> | undefined;

/** Every answer of the API, refusals included, is as its own document says. */
async function problemWithAnswer({ route, method }: RouteRow<Made>, response: Response, text: string): Promise<string | undefined> {
  if (!route.startsWith('api/v1/') || route.endsWith('openapi.json')) return undefined;
  const path = route.slice('api/v1'.length).replaceAll('[', '{').replaceAll(']', '}');
  return (await (described ??= DescribedAnswers.fromRoute())).problemWith({ method, path, status: response.status, contentType: response.headers.get('content-type'), text });
}

async function tryRoute(row: RouteRow<Made>, made: Made, browser: Browser, change: Change): Promise<Outcome> {
  const handle = (await load(`${row.route}/route.ts`))[row.method] as (request: NextRequest, context: unknown) => Promise<Response>;
  const query = new URLSearchParams(Object.entries({ ...row.query?.(made), ...change.query }).map(([name, value]) => [name, String(value)]));
  const isRead = row.method === 'GET';
  const path = `/${row.route}?${query}`;
  const headers = browser.headers({ origin: 'http://carryover.test', ...(!isRead && { 'content-type': 'application/json' }), ...row.headers?.(), ...change.headers });
  const request = new NextRequest(new URL(path, 'http://carryover.test'), {
    method: row.method,
    headers,
    ...(!isRead && { body: change.body ?? JSON.stringify(row.body?.(made) ?? {}) }),
  });
  const params = Promise.resolve(change.params ?? row.params?.(made));
  try {
    const response = await browser.act(path, () => handle(request, { params }), headers);
    const text = await textOf(response);
    const notAsDescribed = await problemWithAnswer(row, response, text);
    if (notAsDescribed) return { kind: 'broken', status: response.status, message: notAsDescribed, text };
    const kind = response.status >= 500 ? 'broken' : response.status >= 400 ? 'refused' : 'done';
    return { kind, status: response.status, message: text, text, ...(response.headers.get('location') && { redirect: response.headers.get('location') ?? '' }) };
  } catch (error) {
    return outcomeOfThrown(error);
  }
}

export const tryRow = (row: Row, made: Made, browser: Browser, change: Change = {}): Promise<Outcome> =>
  'page' in row ? tryPage(row, made, browser, change) : 'action' in row ? tryAction(row, made, browser, change) : tryRoute(row, made, browser, change);
