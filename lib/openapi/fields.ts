/** As much of JSON Schema as the document holds. */
export interface Schema {
  $ref?: string;
  type?: string | string[];
  format?: string;
  description?: string;
  const?: unknown;
  enum?: unknown[];
  default?: unknown;
  minimum?: number;
  maximum?: number;
  maxLength?: number;
  properties?: Record<string, Schema>;
  required?: string[];
  items?: Schema;
  prefixItems?: Schema[];
  additionalProperties?: boolean | Schema;
  anyOf?: Schema[];
  oneOf?: Schema[];
}

export interface Field {
  /** "unit.fleetNumber", "readings[].readOn" */
  path: string;
  type: string;
  /** Name of the schema that its type is, to be looked up. */
  of?: string;
  isRequired: boolean;
  description?: string;
  /** Only in this variant: "kind is “new”". */
  when?: string;
}

/** Below that a schema is only named. */
const DEEPEST = 4;

const FORMATS: Record<string, string> = { uuid: 'uuid', date: 'day, YYYY-MM-DD', 'date-time': 'instant, ISO 8601', email: 'email address' };
const TYPES: Record<string, string> = { integer: 'whole number', number: 'number', boolean: 'true or false', string: 'text', null: 'null' };

const asText = (value: unknown) => (typeof value === 'string' ? `“${value}”` : JSON.stringify(value));

/** The name of the schema that this one is, or that its items or values are. */
export function nameIn(schema: Schema): string | undefined {
  if (schema.$ref) return schema.$ref.split('/').at(-1);
  const inner = schema.items ?? (typeof schema.additionalProperties === 'object' ? schema.additionalProperties : undefined);
  return inner ? nameIn(inner) : variantsOf(schema).map(nameIn).find((name) => name !== undefined);
}

/** `anyOf` with null is a thing that may be null, which isn't a choice. */
const variantsOf = ({ anyOf, oneOf }: Schema): Schema[] => (oneOf ?? anyOf ?? []).filter(({ type }) => type !== 'null');
const mayBeNull = ({ anyOf, oneOf }: Schema) => (oneOf ?? anyOf ?? []).some(({ type }) => type === 'null');

/**
 * What may stand there, in a few words.
 * @example typeInWords({ type: 'array', items: { type: 'string' } }) // 'list of text'
 */
export function typeInWords(schema: Schema): string {
  if (schema.$ref) return nameIn(schema) ?? 'object';
  if (schema.const !== undefined) return asText(schema.const);
  if (schema.enum) return schema.enum.map(asText).join(', ');
  const variants = variantsOf(schema);
  if (variants.length > 0) return [...new Set([...variants.map(typeInWords), ...(mayBeNull(schema) ? ['null'] : [])])].join(' or ');
  const types = [schema.type ?? []].flat();
  if (types.includes('array')) return schema.items ? `list of ${typeInWords(schema.items)}` : 'list';
  if (types.includes('object')) return typeof schema.additionalProperties === 'object' ? `${typeInWords(schema.additionalProperties)} by name` : 'object';
  const [one] = types;
  if (one === undefined) return 'anything';
  const range = schema.minimum !== undefined && schema.maximum !== undefined && Number.isSafeInteger(schema.maximum) && schema.maximum < 1e9 ? ` from ${schema.minimum} to ${schema.maximum}` : '';
  return `${FORMATS[schema.format ?? ''] ?? TYPES[one] ?? one}${range}`;
}

/** The fields of a schema in a flat list, those of what it holds after each. */
export function fieldsOf(schema: Schema, { prefix = '', when, depth = 0 }: { prefix?: string; when?: string; depth?: number } = {}): Field[] {
  if (depth > DEEPEST || schema.$ref) return [];
  const variants = variantsOf(schema);
  if (variants.length > 0) return variants.flatMap((variant) => fieldsOf(variant, { prefix, when: conditionOf(variant, prefix) ?? when, depth }));
  if (schema.items) return fieldsOf(schema.items, { prefix: `${prefix.replace(/\.$/, '')}[].`, when, depth });
  if (typeof schema.additionalProperties === 'object') return fieldsOf(schema.additionalProperties, { prefix: `${prefix}*.`, when, depth });
  return Object.entries(schema.properties ?? {}).flatMap(([name, inner]) => [
    {
      path: prefix + name,
      type: typeInWords(inner),
      of: nameIn(inner),
      isRequired: schema.required?.includes(name) ?? false,
      description: [inner.description, inner.default !== undefined && `${asText(inner.default)} unless given.`].filter(Boolean).join(' ') || undefined,
      when: inner.const === undefined ? when : undefined,
    },
    ...fieldsOf(inner, { prefix: `${prefix}${name}.`, when, depth: depth + 1 }),
  ]);
}

/** What tells a variant from the others: the field that has one value in it. */
function conditionOf({ properties }: Schema, prefix: string): string | undefined {
  const [name, fixed] = Object.entries(properties ?? {}).find(([, inner]) => inner.const !== undefined) ?? [];
  return name && fixed ? `${prefix}${name} is ${asText(fixed.const)}` : undefined;
}
