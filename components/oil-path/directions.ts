export type Direction = 'left' | 'right' | 'up' | 'down';

interface Point {
  x: number;
  y: number;
}

const KEYS: Readonly<Record<string, Direction>> = { ArrowLeft: 'left', ArrowRight: 'right', ArrowUp: 'up', ArrowDown: 'down' };
export const directionOf = (key: string): Direction | undefined => KEYS[key];

/** How much further a step aside counts than a step in the direction that was asked for. */
const ASIDE = 2;

/**
 * The next place in a direction as the eye sees it: ahead, and as little aside as possible.
 * @returns its index, or undefined when nothing lies that way
 */
export function nextInDirection(from: Point, direction: Direction, places: readonly Point[]): number | undefined {
  const sign = direction === 'left' || direction === 'up' ? -1 : 1;
  const along = direction === 'left' || direction === 'right' ? 'x' : 'y';
  const across = along === 'x' ? 'y' : 'x';
  const ranked = places
    .map((place, index) => ({ index, ahead: (place[along] - from[along]) * sign, aside: Math.abs(place[across] - from[across]) }))
    .filter(({ ahead, aside }) => ahead > 1 && aside <= ahead * 3)
    .sort((a, b) => a.ahead + a.aside * ASIDE - (b.ahead + b.aside * ASIDE));
  return ranked[0]?.index;
}
