import 'server-only';
import type { z } from 'zod';
import { notSignedIn } from '@/lib/errors';
import type { Service } from '@/lib/services/define';
import { jsonBody } from './body';
import { problemResponse, refuseForeignOrigin } from './problem';
import { getContext } from './session';

type Params = Record<string, string | string[] | undefined>;
export type RouteHandler = (request: Request, context: { params: Promise<Params> }) => Promise<Response>;

interface Parts {
  params: Params;
  query: Record<string, string>;
  /** The JSON of a write; {} for a read. */
  body: unknown;
  request: Request;
}

interface Options<Result> {
  /** From the parts of the request to what the service takes; without it: query, body and params in one object. */
  input?: (parts: Parts) => unknown;
  /** 200 unless given. */
  status?: number;
  /** Instead of the result as JSON. */
  respond?: (result: Result, request: Request) => Response | Promise<Response>;
}

const isRead = (method: string) => method === 'GET' || method === 'HEAD';
const everything = ({ params, query, body }: Parts) => ({ ...query, ...(typeof body === 'object' && !Array.isArray(body) ? body : { body }), ...params });

/**
 * A route handler around a service: Origin, sign-in, size, JSON, role, parsing and problem+json are the same for every
 * one.
 *
 * @example export const POST = route(recordFinding, { status: 201 });
 */
export function route<Schema extends z.ZodType, Result>(service: Service<Schema, Result>, options: Options<Result> = {}): RouteHandler {
  const { input: toInput = everything, status = 200, respond } = options;
  return async (request, context) => {
    try {
      const ctx = await getContext();
      if (!ctx) throw notSignedIn();
      if (!isRead(request.method)) refuseForeignOrigin(request);
      const parts: Parts = {
        params: await context.params,
        query: Object.fromEntries(new URL(request.url).searchParams),
        body: isRead(request.method) ? {} : await jsonBody(request),
        request,
      };
      // Unknown until the service has parsed it, which is the first thing that it does.
      const result = await service({ ctx, input: toInput(parts) as z.input<Schema> });
      if (respond) return await respond(result, request);
      return Response.json(result ?? {}, { status, headers: { 'cache-control': 'private, no-store' } });
    } catch (error) {
      return problemResponse(error, service.action);
    }
  };
}
