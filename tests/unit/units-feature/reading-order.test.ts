import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findContradiction } from '@/lib/services/unit/reading-order';
import { runSince } from '@/lib/services/unit/run-since';

const read = <Value extends number | null>(readOn: string, value: Value, replaced = false) => ({ readOn, value, replaced });

describe('findContradiction', () => {
  const series = [read('2025-01-01', 100), read('2025-02-01', null), read('2025-03-01', 200)];

  test.each([
    ['above the last', read('2025-04-01', 201), undefined],
    ['equal to the last', read('2025-04-01', 200), undefined],
    ['below the last', read('2025-04-01', 199), series[2]],
    ['between its neighbours', read('2025-02-01', 150), undefined],
    ['above the next', read('2025-02-01', 201), series[2]],
    ['below the one before, over a day without a figure', read('2025-02-15', 99), series[0]],
    ['before all, and lower', read('2024-12-01', 5), undefined],
    ['replaced and low', read('2025-04-01', 0, true), undefined],
    ['replaced but above what the new one shows later', read('2025-02-01', 300, true), series[2]],
  ])('%s', (_name, reading, contradicted) => {
    expect(findContradiction(series, reading)).toBe(contradicted);
  });

  test('what stands before a replacement is not compared with what follows it', () => {
    const replaced = [read('2025-01-01', 900), read('2025-02-01', 10, true), read('2025-03-01', 60)];
    expect(findContradiction(replaced, read('2025-01-15', 950))).toBeUndefined();
    expect(findContradiction(replaced, read('2025-02-15', 40))).toBeUndefined();
    expect(findContradiction(replaced, read('2025-02-15', 70))).toBe(replaced[2]);
  });
});

describe('runSince', () => {
  const start = read('2025-01-01', 500);

  test('without a replacement it is the difference', () => {
    expect(runSince(start, [read('2025-01-01', 500), read('2025-02-01', 700), read('2025-03-01', 900)], '2025-12-31')).toEqual({ sum: 400, lastReadOn: '2025-03-01' });
  });

  test('over a replacement each instrument counts for itself, and nothing counts between them', () => {
    const readings = [read('2025-02-01', 900), read('2025-02-01', 7, true), read('2025-03-01', 157)];
    expect(runSince(start, readings, '2025-12-31')).toEqual({ sum: 550, lastReadOn: '2025-03-01' });
  });

  test('over two replacements', () => {
    const readings = [read('2025-02-01', 600), read('2025-03-01', 0, true), read('2025-04-01', 50), read('2025-05-01', 20, true), read('2025-06-01', 25)];
    expect(runSince(start, readings, '2025-12-31').sum).toBe(155);
  });

  test('later days, earlier days and days without a figure do not count', () => {
    const readings = [read('2024-12-01', 100), read('2025-02-01', null), read('2025-02-02', 600), read('2025-06-01', 5000)];
    expect(runSince(start, readings, '2025-03-01')).toEqual({ sum: 100, lastReadOn: '2025-02-02' });
  });

  test('of its own day, a lower figure came before it and a higher one after', () => {
    expect(runSince(start, [read('2025-01-01', 499), read('2025-01-01', 500), read('2025-01-01', 503)], '2025-01-01').sum).toBe(3);
  });

  test('is what was run, however often the instrument was replaced, when each is read as it goes', () => {
    const step = fc.record({ run: fc.integer({ min: 0, max: 1000 }), replacedBy: fc.option(fc.integer({ min: 0, max: 900 })) });
    fc.assert(
      fc.property(fc.array(step, { maxLength: 20 }), (steps) => {
        let value = 500;
        const readings = steps.flatMap(({ run, replacedBy }, index) => {
          const readOn = `2025-02-${String(index + 1).padStart(2, '0')}`;
          value += run;
          const rows = [read(readOn, value)];
          if (replacedBy === null) return rows;
          value = replacedBy;
          return [...rows, read(readOn, value, true)];
        });
        expect(runSince(start, Object.freeze(readings), '2025-12-31').sum).toBe(steps.reduce((sum, { run }) => sum + run, 0));
      }),
    );
  });
});
