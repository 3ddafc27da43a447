'use client';

import { useRef, useState, type PointerEvent } from 'react';
import type { Stroke } from '@/lib/schemas/photo';
import { extended, pointAt } from './strokes';

/** Draws with whatever points: finger, glove, mouse or pen; one line at a time. */
export function usePen(onStroke: (stroke: Stroke) => void) {
  const [drawn, setDrawn] = useState<Stroke['points'] | null>(null);
  const points = useRef<Stroke['points'] | null>(null);

  const add = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const moves = event.nativeEvent.getCoalescedEvents?.() ?? [];
    for (const { clientX, clientY } of moves.length > 0 ? moves : [event.nativeEvent]) {
      points.current = extended(points.current ?? [], pointAt((clientX - box.left) / box.width, (clientY - box.top) / box.height));
    }
    setDrawn(points.current);
  };
  const end = () => {
    if (points.current) onStroke({ points: points.current });
    points.current = null;
    setDrawn(null);
  };
  const handlers = {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      if (!event.isPrimary || event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      points.current = [];
      add(event);
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      if (event.isPrimary && points.current) add(event);
    },
    onPointerUp: end,
    onPointerCancel: end,
  };
  return { drawing: drawn && { points: drawn }, handlers };
}
