import { readdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { Ajv2020 } from 'ajv/dist/2020';
import addFormats from 'ajv-formats';
import { beforeAll, describe, expect, test } from 'vitest';
import { SCOPE_IDS } from '@/lib/auth/scopes';
import { DescribedAnswers } from '@/tests/support/described';
import { openApplication } from '@/tests/support/application';

const V1 = join(import.meta.dirname, '../../../app/api/v1');
const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'];

interface Described {
  operationId: string;
  summary: string;
  security: Record<string, string[]>[];
  parameters?: { name: string; in: string }[];
  requestBody?: { content: Record<string, { schema: { properties?: object } }> };
  responses: Record<string, { content?: Record<string, { schema: object }> }>;
}

let document: { openapi: string; paths: Record<string, Record<string, Described>>; components: { schemas: object } };
let operations: [string, Described][];

beforeAll(async () => {
  const databases = await openApplication();
  document = (await DescribedAnswers.fromRoute()).document as never;
  operations = Object.entries(document.paths).flatMap(([path, methods]) => Object.entries(methods).map(([method, operation]): [string, Described] => [`${method.toUpperCase()} ${path}`, operation]));
  return () => databases.close();
});

test('every route is in the document, and nothing else is', async () => {
  const folders = readdirSync(V1, { recursive: true, encoding: 'utf8' }).filter((path) => path.endsWith('route.ts') && !path.startsWith('openapi.json')).map(dirname);
  const there = await Promise.all(
    folders.map(async (folder) => {
      const handlers = (await import(/* @vite-ignore */ join(V1, folder, 'route.ts'))) as object;
      return Object.keys(handlers).filter((name) => METHODS.includes(name)).map((method) => `${method} /${folder.replaceAll('[', '{').replaceAll(']', '}')}`);
    }),
  );
  expect(operations.map(([name]) => name).sort()).toEqual(there.flat().sort());
});

test('it is OpenAPI 3.1 whose schemas are JSON Schema 2020-12', () => {
  expect(document.openapi).toMatch(/^3\.1\./);
  const ajv = new Ajv2020({ strict: false });
  addFormats.default(ajv);
  for (const [name, { responses, requestBody }] of operations) {
    const contents = [...Object.values(responses).map(({ content }) => content), requestBody?.content];
    for (const content of contents) for (const { schema } of Object.values(content ?? {})) expect([name, ajv.validateSchema(schema)]).toEqual([name, true]);
  }
});

/** What goes in is too long for an address; nothing is written. */
const ASKED_BY_POST = ['POST /bench/{sum}'];

test('names what can be asked by a token, with scopes that exist', () => {
  for (const [name, { security }] of operations) {
    const scopes = security.flatMap(({ token }) => token ?? []);
    expect([name, scopes.length]).toEqual([name, 1]);
    expect(SCOPE_IDS).toContain(scopes[0]);
    expect([name, scopes[0]?.endsWith(':read')]).toEqual([name, name.startsWith('GET') || ASKED_BY_POST.includes(name)]);
  }
});

test('each operation has a name of its own, words, and an answer that says what it holds', () => {
  const ids = operations.map(([, { operationId }]) => operationId);
  expect(new Set(ids).size).toBe(ids.length);
  for (const [name, { summary, responses }] of operations) {
    expect([name, summary]).toEqual([name, expect.stringMatching(/^[A-Z][^.]+$/)]);
    const [, done] = Object.entries(responses).find(([status]) => status.startsWith('2')) ?? [];
    const schema = Object.values(done?.content ?? {})[0]?.schema ?? {};
    expect([name, Object.keys(schema).length > 0]).toEqual([name, true]);
  }
});

describe('what an operation takes', () => {
  test('stands in path, query, header or body, each once', () => {
    for (const [name, { parameters = [], requestBody }] of operations) {
      const inPath = parameters.filter((parameter) => parameter.in === 'path').map((parameter) => parameter.name);
      expect([name, inPath]).toEqual([name, [...name.matchAll(/\{(\w+)\}/g)].map((match) => match[1])]);
      const body = Object.keys(requestBody?.content['application/json']?.schema.properties ?? {});
      expect([name, body.filter((field) => /^(case|unit|fit|model|site|photo)Id$/.test(field) && inPath.length > 0 && field !== 'modelId' && field !== 'siteId')]).toEqual([name, []]);
      expect([name, body.includes('version')]).toEqual([name, false]);
    }
  });

  test('says that every write can be repeated safely', () => {
    for (const [name, { parameters = [] }] of operations) {
      const headers = parameters.filter((parameter) => parameter.in === 'header').map((parameter) => parameter.name);
      expect([name, headers.includes('Idempotency-Key')]).toEqual([name, !name.startsWith('GET')]);
    }
  });
});
