import type { apiDocument } from './document';
import { fieldsOf, type Field, type Schema } from './fields';

type Document = ReturnType<typeof apiDocument>;

/** As the document has one, in the shape that the page shows. */
export interface ReadableOperation {
  operationId: string;
  method: string;
  path: string;
  summary: string;
  description?: string;
  scope?: string;
  parameters: { name: string; in: string; required?: boolean; description?: string; schema: Schema }[];
  body?: Schema;
  /** When it is done. */
  answer: { status: string; description: string; schema?: Schema };
  /** Statuses that it refuses with. */
  refusals: string[];
}

export interface ReadableSchema {
  name: string;
  description?: string;
  fields: Field[];
}

/** What can be asked about one kind of thing, and what comes back. */
export interface Group {
  id: string;
  title: string;
  operations: ReadableOperation[];
  schemas: ReadableSchema[];
}

export interface Readable {
  introduction: string;
  groups: Group[];
  problem: ReadableSchema;
}

interface RawOperation extends Omit<ReadableOperation, 'method' | 'path' | 'scope' | 'body' | 'answer' | 'refusals' | 'parameters'> {
  security: Record<string, string[]>[];
  tags: string[];
  parameters?: ReadableOperation['parameters'];
  requestBody?: { content: Record<string, { schema: Schema }> };
  responses: Record<string, { description: string; content?: Record<string, { schema: Schema }> }>;
}

const firstSchema = (content?: Record<string, { schema: Schema }>) => Object.values(content ?? {})[0]?.schema;

const PROBLEM = 'Problem';
/** Redirection and refusal begin here; below it is done. */
const isDone = (status: string) => status < '300';

/** Names of the schemas that a piece of the document leads to, through those that it names. */
function namedIn(piece: unknown, schemas: Record<string, Schema>, found = new Set<string>()): Set<string> {
  for (const [, name] of JSON.stringify(piece).matchAll(/"\$ref":"#\/components\/schemas\/(\w+)"/g)) {
    if (name === undefined || name === PROBLEM || found.has(name)) continue;
    found.add(name);
    namedIn(schemas[name], schemas, found);
  }
  return found;
}

/** Sorts the document for reading, by the kind of thing that is asked about. */
export function readable(document: Document): Readable {
  // Plain JSON from here on, as whoever fetches the document gets it.
  const { info, paths, components } = JSON.parse(JSON.stringify(document)) as {
    info: { description: string };
    paths: Record<string, Record<string, RawOperation>>;
    components: { schemas: Record<string, Schema> };
  };
  const schemaOf = (name: string): ReadableSchema => ({ name, description: components.schemas[name]?.description, fields: fieldsOf(components.schemas[name] ?? {}) });
  const byTag = new Map<string, { path: string; method: string; raw: RawOperation }[]>();
  for (const [path, methods] of Object.entries(paths)) {
    for (const [method, raw] of Object.entries(methods)) {
      const tag = raw.tags[0] ?? '';
      byTag.set(tag, [...(byTag.get(tag) ?? []), { path, method, raw }]);
    }
  }
  return {
    introduction: info.description,
    problem: schemaOf(PROBLEM),
    groups: [...byTag].map(([id, operations]) => ({
      id,
      title: id.charAt(0).toUpperCase() + id.slice(1),
      operations: operations.map(readableOperation),
      schemas: [...namedIn(operations, components.schemas)].sort().map(schemaOf),
    })),
  };
}

function readableOperation({ path, method, raw }: { path: string; method: string; raw: RawOperation }): ReadableOperation {
  const { operationId, summary, description, security, parameters = [], requestBody, responses } = raw;
  const [status = '', done] = Object.entries(responses).find(([code]) => isDone(code)) ?? [];
  return {
    operationId,
    summary,
    description,
    method: method.toUpperCase(),
    path,
    scope: security.flatMap(({ token }) => token ?? [])[0],
    parameters,
    body: firstSchema(requestBody?.content),
    answer: { status, description: done?.description ?? '', schema: firstSchema(done?.content) },
    refusals: Object.keys(responses).filter((code) => !isDone(code)),
  };
}
