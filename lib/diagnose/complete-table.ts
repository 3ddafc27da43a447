import { sumOf } from './sum';

/** A cause's row in the table of one check, completed so that its answers' chances sum to one. */
export type CompletedRow =
  | {
      coherent: true;
      /** Taken off each given weight, nats: 0 unless every answer was given and the sum was a little off. */
      excess: number;
      /** Weight of every answer that was not given, nats. */
      fill: number;
    }
  | {
      coherent: false;
      /** sum of b_v e^{w_v} over the given answers; at or above 1, or off 1 where all are given. */
      total: number;
    };

/** How far sum of b_v e^{w_v} may be off 1 where an author gives every answer. */
export const NORMALISED_WITHIN = 0.01;

/**
 * Completes one cause's weights over the answers of one check. Where only the telling answers are given, all the
 * others get one equal weight, ln of (1 - sum_given b_v e^{w_v}) / (1 - sum_given b_v): else a table of positive
 * weights alone would make the cause likelier whatever was answered.
 *
 * @param backgrounds b_v of each answer, (0, 1), summing to 1
 * @param given weight of each answer in nats; undefined where the author gave none
 * @returns the completed row, or the sum that makes it impossible
 * @example completeRow([0.2, 0.8], [Math.LN2, undefined]) // { coherent: true, excess: 0, fill: ln(0.6 / 0.8) }
 */
export function completeRow(backgrounds: readonly number[], given: readonly (number | undefined)[]): CompletedRow {
  const told: number[] = [];
  const untold: number[] = [];
  given.forEach((nats, state) => {
    const background = backgrounds[state] ?? 0;
    if (nats === undefined) untold.push(background);
    else told.push(background * Math.exp(nats));
  });
  if (told.length === 0) return { coherent: true, excess: 0, fill: 0 };
  const total = sumOf(told);
  if (untold.length === 0) {
    return Math.abs(total - 1) < NORMALISED_WITHIN
      ? { coherent: true, excess: Math.log(total), fill: 0 }
      : { coherent: false, total };
  }
  return total < 1
    ? { coherent: true, excess: 0, fill: Math.log((1 - total) / sumOf(untold)) }
    : { coherent: false, total };
}
