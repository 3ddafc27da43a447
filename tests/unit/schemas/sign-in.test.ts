import { describe, expect, test } from 'vitest';
import { checkbox, email, several } from '@/lib/schemas/common';
import { linkToken, newPassword } from '@/lib/schemas/sign-in';
import { z } from 'zod';

describe('a password that is chosen', () => {
  test.each(['correct horse', 'ünïcödé wörds', ' spaces around it '])('may be "%s", kept as it is', (password) => {
    expect(newPassword.parse(password)).toBe(password);
  });
  test.each(['short', 'elevenchars', 'aaaaaaaaaaaa', 'abababababab', 'x'.repeat(201), undefined])('may not be "%s"', (password) => {
    expect(newPassword.safeParse(password).success).toBe(false);
  });
});

test('addresses are compared in lower case, without spaces around them', () => {
  expect(email.parse('  Some.Body@Example.TEST ')).toBe('some.body@example.test');
  for (const wrong of ['', 'somebody', 'a@b', '@example.test', 'a b@example.test', `${'a'.repeat(250)}@example.test`]) expect(email.safeParse(wrong).success).toBe(false);
});

test('a link has 43 characters and no other form', () => {
  expect(linkToken.safeParse('A'.repeat(43)).success).toBe(true);
  for (const wrong of ['', 'A'.repeat(42), 'A'.repeat(44), `${'A'.repeat(42)}%`]) expect(linkToken.safeParse(wrong).success).toBe(false);
});

test('a box that is not ticked sends nothing', () => {
  const schema = z.object({ ticked: checkbox });
  expect([{}, { ticked: '' }, { ticked: 'false' }, { ticked: false }].map((input) => schema.parse(input).ticked)).toEqual([false, false, false, false]);
  expect([{ ticked: 'on' }, { ticked: true }].map((input) => schema.parse(input).ticked)).toEqual([true, true]);
});

test('of several boxes one or none may be ticked', () => {
  const schema = z.object({ roles: several(z.string()) });
  expect([{}, { roles: 'a' }, { roles: ['a', 'b'] }].map((input) => schema.parse(input).roles)).toEqual([[], ['a'], ['a', 'b']]);
});
