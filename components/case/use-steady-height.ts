import { useLayoutEffect, type RefObject } from 'react';

/**
 * Lets an element reach to the lower edge of the window, or further, from a tap on: what lies below is out of sight by
 * the tap's own doing, and not moved long after it when something of another height comes in over a slow line.
 *
 * @param of the element whose content changes
 * @param turn changes with each tap and with the content
 */
export function useSteadyHeight(of: RefObject<HTMLElement | null>, turn: string): void {
  useLayoutEffect(() => {
    const element = of.current;
    element?.style.setProperty('--held-height', `${Math.max(0, innerHeight - element.getBoundingClientRect().top)}px`);
  }, [of, turn]);
}
