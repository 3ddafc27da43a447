/** An answer that by itself, with nothing else known, may lift a cause over one half. */
export interface DecisiveAnswer {
  check: string;
  state: string;
  cause: string;
  because: string;
}

/**
 * All the answers that may settle a case alone, each with its reason. In each the cause itself is seen, not a sign of
 * it; whatever else a rule says needs a second finding beside it.
 */
export const decisiveAnswers: DecisiveAnswer[] = [
  {
    check: 'coolant-in-wet-tank',
    state: 'yes',
    cause: 'head-gasket-failed',
    because: 'Coolant and air meet in one place only: the compressor’s head.',
  },
  {
    check: 'crank-turns',
    state: 'stands-still',
    cause: 'drive-gear-failed',
    because: 'A crank that stands still while the engine turns isn’t driven; a broken crank is the rarer half of it.',
  },
  {
    check: 'drain-passage',
    state: 'blocked',
    cause: 'drain-choked-by-sealant',
    because: 'The closed drain is seen; sealant is what closes it, far more often than anything else.',
  },
  {
    check: 'intake-hose-flattens',
    state: 'yes',
    cause: 'intake-hose-collapsed',
    because: 'The hose is seen to close.',
  },
  {
    check: 'line-bore',
    state: 'under-6',
    cause: 'discharge-line-carboned',
    because: 'Nothing but layers of carbon takes ten millimetres of bore from a line.',
  },
  {
    check: 'ring-bore-state',
    state: 'not-seated',
    cause: 'rings-not-seated',
    because: 'Honing marks that are still whole show it.',
  },
  {
    check: 'sealant-in-drain',
    state: 'yes',
    cause: 'drain-choked-by-sealant',
    because: 'The sealant is seen in the drain.',
  },
];
