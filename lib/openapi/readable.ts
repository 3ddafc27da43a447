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
  answers: { status: string; description: string; schema?: Schema }[];
}

export interface Readable {
  introduction: string;
  groups: { title: string; operations: ReadableOperation[] }[];
  schemas: { name: string; description?: string; fields: Field[] }[];
}

interface RawOperation extends Omit<ReadableOperation, 'method' | 'path' | 'scope' | 'body' | 'answers' | 'parameters'> {
  security: Record<string, string[]>[];
  tags: string[];
  parameters?: ReadableOperation['parameters'];
  requestBody?: { content: Record<string, { schema: Schema }> };
  responses: Record<string, { description: string; content?: Record<string, { schema: Schema }> }>;
}

const firstSchema = (content?: Record<string, { schema: Schema }>) => Object.values(content ?? {})[0]?.schema;

/** Sorts the document for reading: what can be asked by the thing that it is about, and then what comes back. */
export function readable(document: Document): Readable {
  // Plain JSON from here on, as whoever fetches the document gets it.
  const { info, paths, components } = JSON.parse(JSON.stringify(document)) as {
    info: { description: string };
    paths: Record<string, Record<string, RawOperation>>;
    components: { schemas: Record<string, Schema> };
  };
  const groups = new Map<string, ReadableOperation[]>();
  for (const [path, methods] of Object.entries(paths)) {
    for (const [method, { security, tags, parameters = [], requestBody, responses, ...rest }] of Object.entries(methods)) {
      const title = tags[0] ?? '';
      const operation: ReadableOperation = {
        ...rest,
        method: method.toUpperCase(),
        path,
        scope: security.flatMap(({ token }) => token ?? [])[0],
        parameters,
        body: firstSchema(requestBody?.content),
        answers: Object.entries(responses).map(([status, { description, content }]) => ({ status, description, schema: firstSchema(content) })),
      };
      groups.set(title, [...(groups.get(title) ?? []), operation]);
    }
  }
  return {
    introduction: info.description,
    groups: [...groups].map(([title, operations]) => ({ title: title.charAt(0).toUpperCase() + title.slice(1), operations })),
    schemas: Object.entries(components.schemas).map(([name, schema]) => ({ name, description: schema.description, fields: fieldsOf(schema) })),
  };
}
