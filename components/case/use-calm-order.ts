import { useLayoutEffect, useRef, type RefObject } from 'react';

/**
 * Lets the rows of a list glide to their new places when their order changes; without a change nothing moves, and under
 * reduced motion nothing glides.
 */
export function useCalmOrder(order: string): RefObject<HTMLOListElement | null> {
  const list = useRef<HTMLOListElement>(null);
  const places = useRef(new Map<Element, number>());
  useLayoutEffect(() => {
    const rows = [...(list.current?.children ?? [])].filter((row) => row instanceof HTMLElement);
    const calm = matchMedia('(prefers-reduced-motion: reduce)').matches;
    for (const row of rows) {
      const before = places.current.get(row);
      const moved = before === undefined ? 0 : before - row.offsetTop;
      if (moved !== 0 && !calm) row.animate({ transform: [`translateY(${moved}px)`, 'none'] }, { duration: 500, easing: 'cubic-bezier(0.3, 0.1, 0.2, 1)' });
    }
    places.current = new Map(rows.map((row) => [row, row.offsetTop]));
  }, [order]);
  return list;
}
