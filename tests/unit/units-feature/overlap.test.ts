import fc from 'fast-check';
import { expect, test } from 'vitest';
import { overlaps, type Span } from '@/lib/services/fit/overlap';

const span = (installedOn: string, removedOn: string | null = null): Span => ({ installedOn, removedOn });

test.each([
  ['one after the other', span('2024-01-01', '2024-06-01'), span('2024-07-01'), false],
  ['changed on one day', span('2024-01-01', '2024-06-01'), span('2024-06-01'), false],
  ['a day too early', span('2024-01-01', '2024-06-01'), span('2024-05-31'), true],
  ['within another', span('2024-01-01'), span('2024-02-01', '2024-03-01'), true],
  ['two that are still on', span('2024-01-01'), span('2025-01-01'), true],
  ['on and off on the day of a change', span('2024-06-01', '2024-06-01'), span('2024-06-01'), false],
])('%s', (_name, a, b, expected) => {
  expect(overlaps(a, b)).toBe(expected);
  expect(overlaps(b, a)).toBe(expected);
});

test('agrees with counting days', () => {
  const day = fc.integer({ min: 1, max: 9 });
  const spans = fc.tuple(day, fc.option(fc.integer({ min: 1, max: 4 }))).map(([from, days]) => ({ from, to: days === null ? null : Math.min(from + days, 9) })).filter(({ from, to }) => to === null || to > from);
  const text = (at: number | null) => (at === null ? null : `2024-01-0${at}`);
  fc.assert(
    fc.property(spans, spans, (a, b) => {
      const days = ({ from, to }: { from: number; to: number | null }) => Array.from({ length: (to ?? 10) - from }, (_, index) => from + index);
      const both = days(a).some((at) => days(b).includes(at));
      expect(overlaps(span(text(a.from) ?? '', text(a.to)), span(text(b.from) ?? '', text(b.to)))).toBe(both);
    }),
  );
});
