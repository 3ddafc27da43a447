'use client';

import { useId, useState } from 'react';
import { LiveRegion } from '@/components/ui/LiveRegion';
import type { Stroke } from '@/lib/schemas/photo';
import { Marks } from './Marks';
import { usePen } from './use-pen';
import { useRing } from './use-ring';

interface Props {
  src: string | null;
  /** Where the picture itself can't be had. */
  fallback: string | null;
  alt: string;
  width: number;
  height: number;
  strokes: readonly Stroke[];
  /** null: it can only be looked at. */
  onStroke: ((stroke: Stroke) => void) | null;
}

/** A photo as large as there is room, to draw on. */
export function PhotoCanvas({ src, fallback, alt, width, height, strokes, onStroke }: Props) {
  const helpId = useId();
  const [failed, setFailed] = useState(false);
  const draw = (stroke: Stroke) => onStroke?.(stroke);
  const pen = usePen(draw);
  const ring = useRing(width / height, draw);
  const shown = (failed ? fallback : src) ?? undefined;
  const extra = [pen.drawing, ring.ring].filter((stroke) => stroke !== null);
  const frame = 'relative mx-auto max-w-full border border-edge bg-sunk';
  const size = { aspectRatio: `${width} / ${height}`, width: `min(100%, calc(62dvh * ${width / height}))` };
  // eslint-disable-next-line @next/next/no-img-element -- from this device or through our own route, as it is
  const picture = shown && <img src={shown} alt={alt} draggable={false} className="absolute inset-0 size-full select-none" onError={() => setFailed(true)} />;
  if (!onStroke) return <div className={frame} style={size}>{picture}<Marks strokes={strokes} /></div>;
  return (
    <div className="grid gap-2">
      {/* The keys belong to the ring here, which no ordinary element has. */}
      <div role="application" aria-label={`Draw on: ${alt}`} aria-describedby={helpId} tabIndex={0} className={`${frame} cursor-crosshair touch-none`} style={size} {...pen.handlers} onKeyDown={ring.onKeyDown}>
        {picture}
        <Marks strokes={[...strokes, ...extra]} />
      </div>
      <p id={helpId} className="text-[0.9375rem] text-ink-soft">
        Draw on the picture with a finger or the mouse. By keys: arrows move a ring, + and − size it, Enter sets it.
      </p>
      <LiveRegion>{ring.said}</LiveRegion>
    </div>
  );
}
