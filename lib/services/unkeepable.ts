import { invalid, type FieldErrors } from '@/lib/errors';

/** PostgreSQL keeps neither a NUL nor half of a surrogate pair; no keyboard types them. */
const UNKEEPABLE = /[\0\p{Surrogate}]/u;

/**
 * Refuses text that the database would fail on, wherever in the input it stands. Without recursion, because somebody
 * may send a body nested ten thousand deep.
 *
 * @throws AppError "invalid" with the path of each such text
 */
export function refuseUnkeepable(input: unknown): void {
  const fields: FieldErrors = {};
  const waiting: { path: string; value: unknown }[] = [{ path: '', value: input }];
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    const { path, value } = next;
    if (typeof value === 'string' && UNKEEPABLE.test(value)) fields[path] = 'This holds a character that cannot be kept. Type it anew.';
    if (typeof value !== 'object' || value === null) continue;
    for (const [name, inner] of Object.entries(value)) waiting.push({ path: path ? `${path}.${name}` : name, value: inner });
  }
  if (Object.keys(fields).length > 0) throw invalid(fields);
}
