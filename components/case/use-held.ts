import { useState } from 'react';
import type { AtHand } from './at-hand';

interface Standing {
  /** Changes with whatever the person does: answers, picks, goes past. */
  turn: string;
  /** An answer is on its way. */
  pending: boolean;
  /** Whether what is asked can still be answered. */
  isOpen: (asked: AtHand) => boolean;
}

/**
 * The question that stands on the screen. It stays under the hand until the person does something: neither an answer on its
 * way nor a ranking that comes in later, from the server or by somebody else's answer, swaps it for another.
 */
export function useHeld(asked: AtHand | null, { turn, pending, isOpen }: Standing): AtHand | null {
  const [held, setHeld] = useState({ asked, turn });
  const stays = pending || (held.turn === turn && held.asked !== null && isOpen(held.asked));
  if (stays) return held.asked;
  if (held.turn !== turn || nameOf(held.asked) !== nameOf(asked)) setHeld({ asked, turn });
  return asked;
}

export const nameOf = (asked: AtHand | null) => (asked?.kind === 'panel' ? asked.panelId : (asked?.checkId ?? null));
