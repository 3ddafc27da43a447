import { expect, test } from 'vitest';
import { parseError, withoutPlusMinus } from '@/lib/units';

const psi = { quantity: 'pressure', defaultUnit: 'psi' } as const;

test.each(['2', '±2', ' ± 2 psi', '+/- 2', '+-2', '+/−2'])('an error as people write it: %j', (text) => {
  expect(parseError(text, psi)).toEqual(expect.objectContaining({ ok: true, value: 2, unit: 'psi' }));
});

test('an error of a temperature is a difference', () => {
  expect(parseError('±9 °F', { quantity: 'temperature', defaultUnit: 'degF' })).toMatchObject({ ok: true, si: expect.closeTo(5, 12) });
});

test('less than nothing is refused, and so is nothing at all', () => {
  expect(parseError('-2', psi)).toEqual({ ok: false, message: 'An error is 0 or more.' });
  expect(parseError('± ', psi).ok).toBe(false);
  expect(withoutPlusMinus('± ')).toBe('');
});
