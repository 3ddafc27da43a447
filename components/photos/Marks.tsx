import type { Stroke } from '@/lib/schemas/photo';
import { pathOf } from './strokes';

/**
 * Lines over a photo, in two tones: whatever is under them, one of the two stands out. They are the same in both themes,
 * since the picture is.
 */
export function Marks({ strokes, thin = false }: { strokes: readonly Stroke[]; thin?: boolean }) {
  if (strokes.length === 0) return null;
  const [outer, inner] = thin ? [4, 2] : [9, 4];
  return (
    <svg viewBox="0 0 1 1" preserveAspectRatio="none" aria-hidden="true" className="pointer-events-none absolute inset-0 size-full forced-color-adjust-none" fill="none" strokeLinecap="round" strokeLinejoin="round">
      {strokes.map((stroke, i) => (
        <g key={i}>
          <path d={pathOf(stroke)} stroke="#0f3138" strokeWidth={outer} vectorEffect="non-scaling-stroke" />
          <path d={pathOf(stroke)} stroke="#ffd35c" strokeWidth={inner} vectorEffect="non-scaling-stroke" />
        </g>
      ))}
    </svg>
  );
}
