import 'server-only';
import type { z } from 'zod';
import type { Service } from '@/lib/services/define';
import { callerOf, refuseMissingScope } from './bearer';
import { jsonBody } from './body';
import { etagOf, idempotencyKeyOf, isHeld, versionInIfMatch } from './conditions';
import { problemResponse, refuseForeignOrigin } from './problem';
import type { Scope } from './scopes';

type Params = Record<string, string | string[] | undefined>;
/** Next gives no params to a route without a changing part in its address. */
export type RouteHandler = (request: Request, context: { params: Promise<Params | undefined> }) => Promise<Response>;

interface Parts {
  params: Params;
  query: Record<string, string>;
  /** The JSON of a write; {} for a read. */
  body: unknown;
  request: Request;
}

/** What a value is once it has been JSON. */
export type Json<T> = T extends Date
  ? string
  : T extends readonly (infer Item)[]
    ? Json<Item>[]
    : T extends object
      ? { [Key in keyof T]: Json<T[Key]> }
      : T;

/** What the document says of a route besides what it takes. */
export interface Described<Answer = unknown> {
  /** "Answer a check": what somebody does with it, in a line. */
  summary: string;
  description?: string;
  /** The schema of what is answered. Its type holds all that the service returns. */
  answers: z.ZodType<unknown, Json<Answer>>;
  /** Of what is answered, unless it is JSON. */
  mediaType?: string;
}

interface Options<Result, Answer> {
  /** From the names in the address to those that the service takes, where they differ. */
  params?: Readonly<Record<string, string>>;
  /** From the parts of the request to what the service takes; without it: query, body and params in one object. */
  input?: (parts: Parts) => unknown;
  /** What a personal token must have for this; without one no token will do. */
  scope?: Scope;
  /** 200 unless given. */
  status?: number;
  /** The version that a change is of is taken from `If-Match` and given to the service as `version`. */
  ifMatch?: 'needed' | 'possible';
  /** Of what was read: what `If-Match` of a change names. */
  version?: (result: Result) => string | number;
  /** From the result to what is answered. */
  shape?: (result: Result) => Answer;
  /** Instead of the result as JSON. */
  respond?: (result: Result, request: Request) => Response | Promise<Response>;
  doc?: Described<Answer>;
}

/** What the document is made from. */
export interface Operation {
  service: Service<z.ZodType, unknown>;
  params: Readonly<Record<string, string>>;
  scope?: Scope;
  status: number;
  ifMatch?: 'needed' | 'possible';
  doc?: Described;
}

export type DescribedHandler = RouteHandler & { readonly operation: Operation };

const isRead = (method: string) => method === 'GET' || method === 'HEAD';
const NO_STORE = { 'cache-control': 'private, no-store' };

/**
 * A route handler around a service: Origin, sign-in or token, size, JSON, role, parsing, repeats, conditions and
 * problem+json are the same for every one.
 *
 * @example export const POST = route(recordFinding, { params: { id: 'caseId' }, scope: 'cases:write', status: 201 });
 */
export function route<Schema extends z.ZodType, Result, Answer = Result>(service: Service<Schema, Result>, options: Options<Result, Answer> = {}): DescribedHandler {
  const { params: renamed = {}, input: toInput = inOneObject(renamed), scope, status = 200, ifMatch, version, shape, respond, doc } = options;

  const handler: RouteHandler = async (request, context) => {
    try {
      const caller = await callerOf(request);
      // A cookie goes with any request to us; a token only with one that its holder makes.
      if (!isRead(request.method) && caller.token === null) refuseForeignOrigin(request);
      refuseMissingScope(caller, scope);
      const input = toInput({
        params: (await context.params) ?? {},
        query: Object.fromEntries(new URL(request.url).searchParams),
        body: isRead(request.method) ? {} : await jsonBody(request),
        request,
      });
      const basedOn = ifMatch && versionInIfMatch(request, { needed: ifMatch === 'needed' });
      const answered = { status, replayed: false };
      const key = isRead(request.method) ? undefined : idempotencyKeyOf(request);
      const repeat = key === undefined ? undefined : { key, status, onReplay: (kept: number) => Object.assign(answered, { status: kept, replayed: true }) };
      // Unknown until the service has parsed it, which is the first thing that it does.
      const given = (basedOn === undefined ? input : { ...Object(input), version: basedOn }) as z.input<Schema>;
      const result = await service({ ctx: { ...caller.ctx, repeat }, input: given });
      if (respond) return await respond(result, request);

      const json = JSON.stringify((shape ? shape(result) : result) ?? {});
      const headers: Record<string, string> = { ...NO_STORE, 'content-type': 'application/json', ...(answered.replayed && { 'idempotency-replayed': 'true' }) };
      if (!isRead(request.method)) return new Response(json, { status: answered.status, headers });
      const etag = etagOf(json, version?.(result));
      return isHeld(request, etag) ? new Response(null, { status: 304, headers: { ...NO_STORE, etag } }) : new Response(json, { status, headers: { ...headers, etag } });
    } catch (error) {
      return problemResponse(error, service.action);
    }
  };
  return Object.assign(handler, { operation: { service: service as Service<z.ZodType, unknown>, params: renamed, scope, status, ifMatch, doc: doc as Described | undefined } });
}

/** Query, body and params together; what stands in the address can't be said otherwise in the body. */
const inOneObject =
  (renamed: Readonly<Record<string, string>>) =>
  ({ params, query, body }: Parts) => ({
    ...query,
    ...(typeof body === 'object' && body !== null && !Array.isArray(body) ? body : { body }),
    ...Object.fromEntries(Object.entries(params).map(([name, value]) => [renamed[name] ?? name, value])),
  });
