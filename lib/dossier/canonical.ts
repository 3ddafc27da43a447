import { createHash } from 'node:crypto';

/**
 * JSON that comes out the same for the same content: keys in order of their code units, nothing between the parts.
 *
 * @param value as JSON has it; keys whose value is undefined are left out, as JSON leaves them out
 * @throws TypeError for a number that JSON doesn't know
 * @example canonicalJson({ b: 1, a: [true, null] }) // '{"a":[true,null],"b":1}'
 */
export function canonicalJson(value: unknown): string {
  if (typeof value === 'number' && !Number.isFinite(value)) throw new TypeError(`${value} is no number of JSON`);
  if (Array.isArray(value)) return `[${value.map((item: unknown) => canonicalJson(item ?? null)).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const entries = Object.entries(value).filter(([, held]) => held !== undefined).sort(([a], [b]) => (a < b ? -1 : 1));
  return `{${entries.map(([key, held]) => `${JSON.stringify(key)}:${canonicalJson(held)}`).join(',')}}`;
}

/**
 * SHA-256 of a content in canonical JSON, as 64 hexadecimal digits.
 *
 * @example contentHash({ a: 1 }) === contentHash({ a: 1 })
 */
export const contentHash = (content: unknown): string => createHash('sha256').update(canonicalJson(content)).digest('hex');
