import { describe, expect, test } from 'vitest';
import { formObject, valuesOf } from '@/lib/auth/form';
import { AppError } from '@/lib/errors';

const formOf = (...fields: [string, string | Blob][]) => {
  const form = new FormData();
  for (const [name, value] of fields) form.append(name, value);
  return form;
};
const codeOf = (work: () => unknown) => {
  try {
    work();
    return undefined;
  } catch (error) {
    return error instanceof AppError ? error.code : error;
  }
};

describe('the fields of a form', () => {
  test('are texts, and lists where a name occurs more than once', () => {
    expect({ ...formObject(formOf(['a', '1'], ['b', '2'], ['b', '3'], ['b', '4'])) }).toEqual({ a: '1', b: ['2', '3', '4'] });
  });

  test('leave out files and what React adds', () => {
    expect({ ...formObject(formOf(['$ACTION_KEY', 'k'], ['photo', new Blob(['x'])], ['a', '1'])) }).toEqual({ a: '1' });
  });

  test('have no prototype to be reached by their names', () => {
    const fields = formObject(formOf(['__proto__', 'x'], ['constructor', 'y']));
    expect(Object.keys(fields)).toEqual(['__proto__', 'constructor']);
    expect(({} as Record<string, unknown>).x).toBeUndefined();
  });

  test.each([undefined, null, 'a=b', {}, [], 0])('are refused when %j was sent', (sent) => {
    expect(codeOf(() => formObject(sent))).toBe('invalid');
  });

  test('are refused when they are too long together', () => {
    const half = 'x'.repeat(140 * 1024);
    expect(codeOf(() => formObject(formOf(['a', half], ['b', half])))).toBe('too-large');
  });
});

test('secrets are not sent back to the page', () => {
  expect(valuesOf({ name: 'A', password: 'p', current: 'c', token: 't', roles: ['x', 'y'] })).toEqual({ name: 'A', roles: ['x', 'y'] });
});
