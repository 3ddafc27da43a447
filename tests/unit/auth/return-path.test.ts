import { expect, test } from 'vitest';
import { returnPath } from '@/lib/auth/return-path';

test.each(['/', '/cases', '/cases?status=open&page=2', '/units/1#fits'])('%s is ours to go on to', (path) => {
  expect(returnPath(path)).toBe(path);
});

test.each(['https://elsewhere.test/', '//elsewhere.test', '/\\elsewhere.test', '\\\\elsewhere.test', 'cases', 'javascript:alert(1)', '', '/\t/elsewhere.test', undefined, ['/cases'], null])(
  '%j leads elsewhere or nowhere',
  (path) => {
    expect(returnPath(path)).toBeUndefined();
  },
);
