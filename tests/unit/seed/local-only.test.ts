import { describe, expect, test } from 'vitest';
import { whyNotSeed } from '@/db/seed/local-only';

describe('the demo goes into', () => {
  test.each(['postgres://o:p@127.0.0.1:5432/carryover', 'postgres://o:p@localhost/carryover', 'postgres://o:p@[::1]:5432/c', 'postgres:///carryover?host=/run/postgresql'])('%s', (url) => {
    expect(whyNotSeed(url, 'demo')).toBeUndefined();
  });
});

describe('the demo never goes into', () => {
  test.each(['postgres://o:p@db.example.test/carryover', 'postgres://o:p@127.0.0.1.example.test/c', 'postgres://o:p@10.0.0.5/c', 'postgres://o:p@localhost/c?host=db.example.test'])('%s', (url) => {
    expect(whyNotSeed(url, undefined)).toMatch(/on this machine/);
  });

  test('a production database, wherever it is', () => {
    expect(whyNotSeed('postgres://o:p@localhost/c', 'production')).toMatch(/production/);
  });
});
