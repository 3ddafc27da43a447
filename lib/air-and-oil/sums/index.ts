/** The sums of the bench, each with all that a page, the API or a rulebook needs to drive it without knowing it. */
import { breakInBleed } from './break-in-bleed';
import { buildUp, buildUpLimit, requiredReservoir } from './build-up';
import { buildUpRatio } from './build-up-ratio';
import { carryOver, carryOverByWeight } from './carry-over';
import { delivery } from './delivery';
import { compressionIndex, dischargeTemperature } from './discharge-temperature';
import { drainCapacity } from './drain-capacity';
import { headPressure } from './head-pressure';
import { leakDown } from './leak-down';
import { lineLoss } from './line-loss';
import { measuredBuildUp } from './measured-build-up';
import { leakSize, orificeFlow } from './orifice-flow';
import type { Sum } from './sum';
import { timeLoaded } from './time-loaded';

export { formulaMathml, formulaSpeech, quantitiesOf } from './describe';
export { bandOf, completeInputs, plotPoints, runSum, type BandOptions, type Given, type PlotPoint } from './run-sum';
export type { Outcome, Plot, Sum, SumInput, SumQuantity, Values } from './sum';

/** In the order in which a technician meets them. */
export const SUMS: readonly Sum[] = [
  measuredBuildUp,
  buildUp,
  buildUpRatio,
  buildUpLimit,
  requiredReservoir,
  leakDown,
  leakSize,
  timeLoaded,
  delivery,
  dischargeTemperature,
  compressionIndex,
  lineLoss,
  headPressure,
  orificeFlow,
  breakInBleed,
  drainCapacity,
  carryOver,
  carryOverByWeight,
];

const byId = new Map(SUMS.map((sum) => [sum.id, sum]));

/** The sum of an id, if there is one. */
export function sumOf(id: string): Sum | undefined {
  return byId.get(id);
}

/**
 * The sums that lead to the same outputs as one of them does, itself first: what a check may be answered by that names it.
 *
 * @example waysTo('carry-over').map(({ id }) => id) // ['carry-over', 'carry-over-by-weight']
 */
export function waysTo(id: string): Sum[] {
  const meant = byId.get(id);
  const root = meant?.insteadOf ?? id;
  return [...(meant ? [meant] : []), ...SUMS.filter((sum) => sum.id !== id && (sum.id === root || sum.insteadOf === root))];
}
