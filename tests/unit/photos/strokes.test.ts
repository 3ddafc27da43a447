import { describe, expect, test } from 'vitest';
import { extended, hasRoom, pathOf, pointAt, ringStroke } from '@/components/photos/strokes';
import { strokes as schema, type Stroke } from '@/lib/schemas/photo';
import { MOST_POINTS, MOST_STROKES } from '@/lib/schemas/photo-limits';

describe('a line on a photo', () => {
  test('stays on the picture and is rounded to what a screen shows', () => {
    expect(pointAt(-0.2, 1.4)).toEqual([0, 1]);
    expect(pointAt(1 / 3, 2 / 3)).toEqual([0.3333, 0.6667]);
  });

  test('takes no point where the last one is', () => {
    const line = extended([], [0.5, 0.5]);
    expect(extended(line, [0.501, 0.5])).toEqual([[0.5, 0.5]]);
    expect(extended(line, [0.51, 0.5])).toEqual([[0.5, 0.5], [0.51, 0.5]]);
  });

  test('of one point is a dot', () => {
    expect(pathOf({ points: [[0.1, 0.2]] })).toBe('M0.1 0.2L0.1 0.2');
    expect(pathOf({ points: [[0.1, 0.2], [0.3, 0.4]] })).toBe('M0.1 0.2L0.3 0.4');
    expect(pathOf({ points: [] })).toBe('');
  });
});

describe('a ring', () => {
  test('is round on the picture, whatever its shape, and closed', () => {
    const ratio = 2;
    const { points } = ringStroke({ x: 0.5, y: 0.5, radius: 0.1 }, ratio);
    for (const [x, y] of points) expect(Math.hypot((x - 0.5) * ratio, y - 0.5)).toBeCloseTo(0.1 * ratio, 3);
    expect(points.at(-1)).toEqual(points[0]);
  });

  test('at the edge is cut off by it', () => {
    expect(schema.safeParse([ringStroke({ x: 0, y: 1, radius: 0.45 }, 1.5)]).success).toBe(true);
  });
});

test('what there is room for is what the server takes', () => {
  const line = (points: number): Stroke => ({ points: Array.from({ length: points }, () => [0.5, 0.5]) });
  const many = Array.from({ length: MOST_STROKES - 1 }, () => line(1));
  expect(hasRoom(many)).toBe(true);
  expect(schema.safeParse([...many, line(1)]).success).toBe(true);
  expect(hasRoom([...many, line(1)])).toBe(false);
  expect(schema.safeParse([...many, line(1), line(1)]).success).toBe(false);
  expect(hasRoom([line(MOST_POINTS - 10)], 9)).toBe(true);
  expect(hasRoom([line(MOST_POINTS - 10)], 11)).toBe(false);
  expect(schema.safeParse([line(MOST_POINTS - 10), line(11)]).success).toBe(false);
});
