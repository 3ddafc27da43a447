import type { Stroke } from '@/lib/schemas/photo';
import { MOST_POINTS, MOST_STROKES } from '@/lib/schemas/photo-limits';

type Point = Stroke['points'][number];

/** A ring that is moved by keys: its middle and radius in fractions of the picture's width (the middle's y of its height). */
export interface Ring {
  x: number;
  y: number;
  radius: number;
}

/** Nearer than this to the last point, a point adds nothing that anybody sees. */
const LEAST_STEP = 0.003;
const RING_POINTS = 28;

const kept = (fraction: number) => Math.round(Math.min(1, Math.max(0, fraction)) * 10_000) / 10_000;
export const pointAt = (x: number, y: number): Point => [kept(x), kept(y)];

/** Adds a point to a line that is being drawn, unless it is where the last one is. */
export function extended(points: readonly Point[], [x, y]: Point): Point[] {
  const last = points.at(-1);
  if (last && Math.hypot(last[0] - x, last[1] - y) < LEAST_STEP) return [...points];
  return [...points, [x, y]];
}

/** @param ratio width of the picture over its height, so that a ring comes out round */
export function ringStroke({ x, y, radius }: Ring, ratio: number): Stroke {
  const points = Array.from({ length: RING_POINTS + 1 }, (_, i) => {
    const angle = (i / RING_POINTS) * 2 * Math.PI;
    return pointAt(x + radius * Math.cos(angle), y + radius * ratio * Math.sin(angle));
  });
  return { points };
}

/** Whether one more line can be kept with these. */
export const hasRoom = (strokes: readonly Stroke[], more = 0): boolean =>
  strokes.length < MOST_STROKES && strokes.reduce((sum, { points }) => sum + points.length, more) < MOST_POINTS;

/** The line as the `d` of an SVG path; a single point becomes a dot. */
export function pathOf({ points }: Stroke): string {
  const [first, ...rest] = points;
  if (!first) return '';
  return `M${first.join(' ')}${(rest.length > 0 ? rest : [first]).map((point) => `L${point.join(' ')}`).join('')}`;
}
