import { readdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
// Before anything of Next's.
import { Browser } from './next-request';
import { NextRequest } from 'next/server';
import { DescribedAnswers } from './described';

const HOST = 'http://carryover.test';
const app = fileURLToPath(new URL('../../app', import.meta.url));

const FOLDERS = readdirSync(join(app, 'api'), { recursive: true, encoding: 'utf8' })
  .filter((path) => path.endsWith('route.ts'))
  .map((path) => `api/${dirname(path)}`)
  // What is spelt out goes before what can be anything.
  .sort((a, b) => a.split('[').length - b.split('[').length);

/** The folder of the route that answers a path, and the parameters in it; as Next's router has it. */
function routeOf(path: string): { folder: string; params: Record<string, string> } {
  for (const folder of FOLDERS) {
    const pattern = new RegExp(`^/${folder.replaceAll(/\[(\w+)\]/g, '(?<$1>[^/]+)')}$`);
    const match = pattern.exec(path);
    if (match) return { folder, params: { ...match.groups } };
  }
  throw new Error(`No route answers ${path}`);
}

let described: Promise<DescribedAnswers> | undefined;

export interface ApiCall {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** "/api/v1/units?limit=2" */
  path: string;
  body?: unknown;
  /** A personal token; then no Origin is sent, as a script sends none. */
  token?: string;
  /** Whose cookies to send. */
  browser?: Browser;
  headers?: Record<string, string>;
}

export interface ApiAnswer {
  status: number;
  headers: Headers;
  /** Of any shape: a test says what it expects of it. */
  json: Record<string, unknown> & { detail?: string; errors?: Record<string, string> };
}

/** Sends a request to the route that answers its path, in Next's own request scope, and holds the answer to the document. */
export async function callApi({ method = 'GET', path, body, token, browser = new Browser(), headers: more = {} }: ApiCall): Promise<ApiAnswer> {
  const url = new URL(path, HOST);
  const { folder, params } = routeOf(url.pathname);
  const handlers = (await import(/* @vite-ignore */ join(app, folder, 'route.ts'))) as Record<string, (request: NextRequest, context: unknown) => Promise<Response>>;
  const handle = handlers[method];
  if (!handle) throw new Error(`${folder} has no ${method}`);
  const headers = browser.headers({
    ...(token === undefined ? { origin: HOST } : { authorization: `Bearer ${token}` }),
    ...(body !== undefined && { 'content-type': 'application/json' }),
    ...more,
  });
  const request = new NextRequest(url, { method, headers, ...(body !== undefined && { body: JSON.stringify(body) }) });
  const response = await browser.act(path, () => handle(request, { params: Promise.resolve(params) }), headers);
  const text = await response.text();
  const problem = (await (described ??= DescribedAnswers.fromRoute())).problemWith({
    method,
    path: folder.slice('api/v1'.length).replaceAll('[', '{').replaceAll(']', '}'),
    status: response.status,
    contentType: response.headers.get('content-type'),
    text,
  });
  if (problem) throw new Error(problem);
  return { status: response.status, headers: response.headers, json: text === '' ? {} : (JSON.parse(text) as ApiAnswer['json']) };
}
