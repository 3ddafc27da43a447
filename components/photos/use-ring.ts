'use client';

import { useState, type KeyboardEvent } from 'react';
import type { Stroke } from '@/lib/schemas/photo';
import { ringStroke, type Ring } from './strokes';

const STEP = 0.02;
const AT_FIRST: Ring = { x: 0.5, y: 0.5, radius: 0.1 };
const LEAST_RADIUS = 0.03;
const MOST_RADIUS = 0.45;

const MOVES: Record<string, [x: number, y: number]> = { ArrowLeft: [-STEP, 0], ArrowRight: [STEP, 0], ArrowUp: [0, -STEP], ArrowDown: [0, STEP] };
const within = (value: number, least: number, most: number) => Math.min(most, Math.max(least, value));

/** Points without a pointer: arrows move a ring, plus and minus size it, Enter sets it, Delete takes it away. */
export function useRing(ratio: number, onStroke: (stroke: Stroke) => void) {
  const [ring, setRing] = useState<Ring | null>(null);

  function onKeyDown(event: KeyboardEvent<HTMLElement>): void {
    const { key } = event;
    const held = ring ?? AT_FIRST;
    const move = MOVES[key];
    const grow = key === '+' || key === '=' ? 1.15 : key === '-' ? 1 / 1.15 : 1;
    if (move) setRing(ring ? { ...held, x: within(held.x + move[0], 0, 1), y: within(held.y + move[1], 0, 1) } : AT_FIRST);
    else if (grow !== 1) setRing({ ...held, radius: within(held.radius * grow, LEAST_RADIUS, MOST_RADIUS) });
    else if (key === 'Enter' && ring) {
      onStroke(ringStroke(ring, ratio));
      setRing(null);
    } else if ((key === 'Delete' || key === 'Backspace') && ring) setRing(null);
    else return;
    event.preventDefault();
  }

  const said = ring ? `Ring at ${Math.round(ring.x * 100)} % from the left, ${Math.round(ring.y * 100)} % from the top.` : '';
  return { ring: ring && ringStroke(ring, ratio), said, onKeyDown };
}
