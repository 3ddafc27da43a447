/** Evidence that isn't sure: split over answers (Jeffrey), or only thought so (Pearl's virtual evidence). */
import type { Proofs } from '../../support/outside-values';
import { found, probability, textbook } from './small-rulebook';

/** A cloth by candlelight: green, blue, violet with .3, .3, .4; sold with .4, .4, .8. */
const sold = [0.3 * 0.4, 0.3 * 0.4, 0.4 * 0.8];
const kept = [0.3 * 0.6, 0.3 * 0.6, 0.4 * 0.2];
const total = (parts: number[]) => parts.reduce((sum, part) => sum + part, 0);
const cloth = textbook({
  causes: { sold: total(sold), kept: total(kept) },
  checks: {
    colour: Object.fromEntries(['green', 'blue', 'violet'].map((colour, v) =>
      [colour, [(sold[v] ?? 0) / total(sold), (kept[v] ?? 0) / total(kept)]])),
  },
});
const candle = [{ state: 'green', share: 0.7 }, { state: 'blue', share: 0.25 }, { state: 'violet', share: 0.05 }];
const isSold = (id: string) => id === 'sold';

/**
 * An alarm that somebody thinks went off, four to one. "Think so" of reliability r gives odds of (r / b + 1 - r) to
 * (1 - r) for it against none; that is 4 to 1 where r = 3 b / (1 + 3 b).
 */
const alarm = textbook({ causes: { burglary: 1e-4, none: 1 - 1e-4 }, checks: { alarm: { on: [0.95, 0.01], off: [0.05, 0.99] } } });
function thoughtSo(): number {
  const background = alarm.checks.get('alarm')?.backgrounds[0] ?? NaN;
  const reliability = (3 * background) / (1 + 3 * background);
  return probability(alarm, [found('alarm', 'on', reliability)], (id) => id === 'burglary');
}

export const unsure: Proofs = {
  J01: () => probability(cloth, [], isSold),
  J02: () => probability(cloth, [found('colour', candle)], isSold),
  J04: thoughtSo,
};
