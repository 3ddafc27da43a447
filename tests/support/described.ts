import { Ajv2020, type ValidateFunction } from 'ajv/dist/2020';
import addFormats from 'ajv-formats';

interface Answer {
  method: string;
  /** As the document has it: "/cases/{id}". */
  path: string;
  status: number;
  contentType: string | null;
  text: string;
}

interface Document {
  paths: Record<string, Record<string, { responses: Record<string, { content?: Record<string, unknown> }> }> | undefined>;
}

const pointer = (...parts: string[]) => parts.map((part) => `/${encodeURIComponent(part.replaceAll('~', '~0').replaceAll('/', '~1'))}`).join('');

/** Holds answers to the OpenAPI document that the application serves. */
export class DescribedAnswers {
  readonly #ajv = new Ajv2020({ strict: false, allErrors: true });
  readonly #compiled = new Map<string, ValidateFunction>();

  constructor(readonly document: Document) {
    addFormats.default(this.#ajv);
    this.#ajv.addSchema(document, 'openapi');
  }

  /** The document as its own route serves it. */
  static async fromRoute(): Promise<DescribedAnswers> {
    const { GET } = await import('@/app/api/v1/openapi.json/route');
    return new DescribedAnswers((await GET().json()) as Document);
  }

  /** What is not as the document says, or undefined. */
  problemWith({ method, path, status, contentType, text }: Answer): string | undefined {
    const name = method.toLowerCase();
    const response = this.document.paths[path]?.[name]?.responses[status];
    if (!response) return `${method} ${path} answers ${status}, which the document has not: ${text.slice(0, 300)}`;
    const types = Object.keys(response.content ?? {});
    const sent = contentType?.split(';')[0] ?? '';
    const type = types.find((one) => one === sent || (one.endsWith('/*') && sent.startsWith(one.slice(0, -1))));
    if (types.length > 0 && !type) return `${method} ${path} answers ${status} as ${sent}, not as ${types.join(' or ')}`;
    if (!type?.endsWith('json')) return undefined;
    const validate = this.#validator(pointer('paths', path, name, 'responses', String(status), 'content', type, 'schema'));
    return validate(JSON.parse(text)) ? undefined : `${method} ${path} ${status}: ${this.#ajv.errorsText(validate.errors)} ${JSON.stringify(validate.errors?.[0]?.params)}`;
  }

  #validator(at: string): ValidateFunction {
    const known = this.#compiled.get(at) ?? this.#ajv.compile({ $ref: `openapi#${at}` });
    this.#compiled.set(at, known);
    return known;
  }
}
