import { z } from 'zod';
import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject, type ZodOpenApiResponsesObject } from 'zod-openapi';
import type { Operation } from '@/lib/auth/route';
import { SCOPES } from '@/lib/auth/scopes';
import { problem, PROBLEMS, type ProblemStatus } from './problem';

/** The handlers of a route by method, as its module exports them. */
export type RouteModule = Readonly<Record<string, unknown>>;

const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;
type Method = (typeof METHODS)[number];

export interface DescribedOperation {
  method: Method;
  /** "/cases/{id}/findings" */
  path: string;
  operation: Operation;
}

/** What all routes take and answer, by path and method. */
export function operationsOf(routes: Readonly<Record<string, RouteModule>>): DescribedOperation[] {
  return Object.entries(routes).flatMap(([path, module]) =>
    METHODS.flatMap((method) => {
      const handler = module[method];
      return hasOperation(handler) ? [{ method, path, operation: handler.operation }] : [];
    }),
  );
}

const hasOperation = (handler: unknown): handler is { operation: Operation } => typeof handler === 'function' && 'operation' in handler;

const INTRODUCTION = `Everything that the pages of Carryover do, for scripts.

Send a personal token (Settings, Tokens) as \`Authorization: Bearer …\`, never in an address. It acts as its person, within its scopes.

Ids of what you make are yours: a uuid, best of version 7. Sent twice, a request with the same id makes one thing. For any other write give an \`Idempotency-Key\`: within a day the same request is answered from what it answered first, with \`Idempotency-Replayed: true\`.

Lists answer \`next\`, which goes back as \`cursor\` for the page after. What can be changed has an \`ETag\`, which \`If-Match\` of the change names. Errors are problem+json (RFC 9457).`;

/** The OpenAPI document, made from the schemas that services parse with and those that answers are described by. */
export function apiDocument(routes: Readonly<Record<string, RouteModule>>) {
  const paths: ZodOpenApiPathsObject = {};
  for (const described of operationsOf(routes)) {
    (paths[described.path] ??= {})[described.method.toLowerCase() as Lowercase<Method>] = operationObject(described);
  }
  return createDocument(
    {
      openapi: '3.1.0',
      info: { title: 'Carryover', version: '1', description: INTRODUCTION },
      servers: [{ url: '/api/v1' }],
      paths,
      components: {
        securitySchemes: {
          token: { type: 'http', scheme: 'bearer', description: `A personal token. Its scopes: ${Object.entries(SCOPES).map(([scope, { does }]) => `\`${scope}\` (${does.toLowerCase()})`).join(', ')}.` },
          session: { type: 'apiKey', in: 'cookie', name: 'next-auth.session-token', description: 'The sign-in of the pages; a write then needs the `Origin` of this application.' },
        },
      },
    },
    // What can't be put into JSON Schema is a check that runs in code; its words come with the refusal.
    {
      allowEmptySchema: { unknown: true, any: true, custom: true, transform: true },
      // Zod spells each format out as an expression beside its name.
      override: ({ jsonSchema }) => {
        if (jsonSchema.format !== undefined) delete jsonSchema.pattern;
      },
    },
  );
}

function operationObject({ method, path, operation }: DescribedOperation): ZodOpenApiOperationObject {
  const { service, scope, ifMatch, doc } = operation;
  const { inPath, rest } = inputParts(path, operation);
  const isRead = method === 'GET';
  const headers = {
    ...(isRead && !doc?.mediaType && { 'If-None-Match': z.string().optional().meta({ description: 'An ETag that you have: 304 when it is still so.' }) }),
    ...(ifMatch && { 'If-Match': ifMatch === 'needed' ? IF_MATCH : IF_MATCH.optional() }),
    ...(!isRead && { 'Idempotency-Key': z.string().min(1).max(200).optional().meta({ description: 'Makes the request safe to repeat.' }) }),
  };
  return {
    operationId: method.toLowerCase() + path.replaceAll(/[/-]\{?(\w)(\w*)\}?/g, (_, first: string, others: string) => first.toUpperCase() + others),
    summary: doc?.summary ?? service.action,
    ...(doc?.description && { description: doc.description }),
    tags: [path.split('/')[1] ?? ''],
    security: [...(scope ? [{ token: [scope] }] : []), { session: [] }],
    requestParams: { ...(inPath && { path: inPath }), ...(isRead && rest instanceof z.ZodObject && { query: rest }), header: z.object(headers) },
    ...(!isRead && { requestBody: { required: true, content: { 'application/json': { schema: rest } } } }),
    responses: responsesOf(method, operation),
  };
}

const IF_MATCH = z.string().meta({ description: 'The ETag of the state that this is based on, or `*` for any.' });

/** What the address holds of a service's input, and what is left for query or body. */
function inputParts(path: string, { service: { action, input }, params, ifMatch }: Operation): { inPath?: z.ZodObject; rest: z.ZodType } {
  const names = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name ?? '');
  if (!(input instanceof z.ZodObject)) return { rest: input };
  const shape: Readonly<Record<string, z.ZodType | undefined>> = input.shape;
  const inPath: Record<string, z.ZodType> = {};
  const elsewhere: Record<string, true> = ifMatch ? { version: true } : {};
  for (const name of names) {
    const field = params[name] ?? name;
    const schema = shape[field];
    if (!schema) throw new Error(`${action} takes no ${field}, which ${path} names`);
    inPath[name] = schema;
    elsewhere[field] = true;
  }
  return { ...(names.length > 0 && { inPath: z.object(inPath) }), rest: input.omit(elsewhere) };
}

const etag = z.string().meta({ description: 'Names this state, for If-None-Match and If-Match.' });
const replayed = z.enum(['true']).optional().meta({ description: 'It was done before, and is answered as it was then.' });

function responsesOf(method: Method, { status, ifMatch, doc }: Operation): ZodOpenApiResponsesObject {
  const isRead = method === 'GET';
  const problems: ProblemStatus[] = [401, 403, 404, 409, 422, 500, ...(isRead ? [] : ([400, 413] as const)), ...(ifMatch ? ([412] as const) : []), ...(ifMatch === 'needed' ? ([428] as const) : [])];
  const done = {
    description: isRead ? 'What was asked for.' : 'It is done.',
    headers: z.object(isRead ? (doc?.mediaType ? {} : { ETag: etag }) : { 'Idempotency-Replayed': replayed }),
    content: { [doc?.mediaType ?? 'application/json']: { schema: doc?.answers ?? z.unknown() } },
  };
  return {
    [`${status}` as `${2}${number}${number}`]: done,
    ...(isRead && !doc?.mediaType && { '304': { description: 'It is still as the tag names it.' } }),
    ...Object.fromEntries(problems.sort().map((code) => [code, { description: PROBLEMS[code], content: { 'application/problem+json': { schema: problem } } }])),
  };
}
