import type { Made, Row } from './row';
import type { Change } from './try';

const NONSENSE = '\u0000\ud800☃ %00 <b>';
const LONG = 'x'.repeat(300 * 1024);

const everyValue = <T>(fields: Record<string, unknown> | undefined, value: T): Record<string, T> =>
  Object.fromEntries(Object.keys(fields ?? {}).map((name) => [name, value]));

/** Input that no row can take, by what is wrong with it. */
export function malformed(row: Row, made: Made): Record<string, Change> {
  if ('page' in row) {
    const params = row.params?.(made);
    const names = { ...row.query?.(made), q: '', page: '', sort: '', status: '' };
    return {
      ...(params && { 'an id that is none': { params: everyValue(params, 'not-an-id') }, 'an id of nonsense': { params: everyValue(params, NONSENSE) } }),
      'a query of nonsense': { query: everyValue(names, NONSENSE) },
      'a query of several each': { query: everyValue(names, ['a', 'b']) },
      'an empty query': { query: everyValue(names, '') },
    };
  }
  if ('action' in row) {
    const fields = row.form(made);
    return {
      'no form': { form: { notAForm: { '0': 'x' } } },
      'nothing at all': { form: { notAForm: undefined } },
      nonsense: { form: { fields: everyValue(fields, NONSENSE) } },
      'nothing in any field': { form: { fields: everyValue(fields, '') } },
      'several of each': { form: { fields: everyValue(fields, ['a', 'b']) } },
    };
  }
  const params = row.params?.(made);
  const noId: Record<string, Change> = params && !row.route.includes('[...') ? { 'an id that is none': { params: everyValue(params, 'not-an-id') } } : {};
  if (row.method === 'GET') return { ...noId, 'a query of nonsense': { query: everyValue({ ...row.query?.(made), q: '', page: '', cursor: '' }, NONSENSE) } };
  const fields = row.body?.(made);
  const wrongBodies: Record<string, Change> = fields
    ? {
        'a list for an object': { body: '[1, 2]' },
        'null for an object': { body: 'null' },
        'nonsense in each field': { body: JSON.stringify(everyValue(fields, NONSENSE)) },
        'a number in each field': { body: JSON.stringify(everyValue(fields, -1e308)) },
        'a body deep in itself': { body: '['.repeat(20_000) + ']'.repeat(20_000) },
      }
    : {};
  return {
    ...noId,
    ...wrongBodies,
    'half a body': { body: '{"a":' },
    'a body that is no JSON': { headers: { 'content-type': 'text/plain' }, body: 'a=b' },
  };
}

export function oversized(row: Row, made: Made): Record<string, Change> {
  if ('page' in row) return { 'a long query': { query: everyValue({ ...row.query?.(made), q: '' }, LONG) }, ...(row.params && { 'a long id': { params: everyValue(row.params(made), LONG) } }) };
  if ('action' in row) return { 'a long field': { form: { fields: { ...everyValue(row.form(made), LONG), more: LONG } } } };
  if (row.method === 'GET') return { 'a long query': { query: { q: LONG } } };
  const body = JSON.stringify({ ...row.body?.(made), more: LONG });
  return { 'a long body': { body }, 'a long body that says it is short': { body, headers: { 'content-length': '10' } } };
}
