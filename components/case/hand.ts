/** The hand that holds nothing else: answers and keypad lie on its side of a phone. */
export const hands = ['right', 'left'] as const;
export type Hand = (typeof hands)[number];

export const HAND_COOKIE = 'hand';

/** The hand a cookie stands for; most people have the right one free. */
export function handFrom(cookie: string | undefined): Hand {
  return hands.find((hand) => hand === cookie) ?? 'right';
}

const ONE_YEAR_S = 60 * 60 * 24 * 365;

/** In the browser: kept in the cookie that the page of a case reads. */
export function keepHand(hand: Hand): void {
  document.cookie = `${HAND_COOKIE}=${hand}; path=/; max-age=${ONE_YEAR_S}; samesite=lax`;
}
