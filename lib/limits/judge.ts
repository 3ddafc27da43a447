import type { Limit } from './limit';

/** What a limit says of a measured value; kept with the value, so that a limit adopted later changes nothing said before. */
export interface Judgement {
  limit: Limit;
  verdict: 'within' | 'out';
  /** The value could as well be on the other side, by the error of its reading. */
  doubtful: boolean;
}

/**
 * Judges a measured value by a limit. The value itself decides; what its error leaves open is said beside it.
 *
 * @param value SI, in the limit's quantity
 * @param error how far it may be off either way, SI, 0 or more
 * @example judge({ ...leak, most: 230, below: true }, 230, 10) // out, and doubtful
 */
export function judge(limit: Limit, value: number, error = 0): Judgement {
  const verdict = verdictOn(limit, value);
  return { limit, verdict, doubtful: [value - error, value + error].some((end) => verdictOn(limit, end) !== verdict) };
}

function verdictOn({ least, most, below }: Limit, value: number): Judgement['verdict'] {
  if (least !== null && value < least) return 'out';
  return most !== null && (below ? value >= most : value > most) ? 'out' : 'within';
}
