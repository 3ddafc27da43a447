import type { AdoptedLimit, Limit, LimitFacts } from './limit';

/** From what says most about a unit to what says least: a model's own limit goes before that of a country. */
const weightOf = ({ modelId, country, vehicleKind, builtFrom, builtBefore }: AdoptedLimit): number =>
  (modelId ? 8 : 0) + (country ? 4 : 0) + (vehicleKind ? 2 : 0) + (builtFrom || builtBefore ? 1 : 0);

function fits(limit: AdoptedLimit, unit: LimitFacts): boolean {
  if (limit.modelId && limit.modelId !== unit.modelId) return false;
  if (limit.country && limit.country !== unit.country) return false;
  if (limit.vehicleKind && limit.vehicleKind !== unit.vehicleKind) return false;
  if (!limit.builtFrom && !limit.builtBefore) return true;
  if (unit.builtOn === null) return false;
  return (!limit.builtFrom || unit.builtOn >= limit.builtFrom) && (!limit.builtBefore || unit.builtOn < limit.builtBefore);
}

/**
 * The limit of each check that holds for a unit: of those that fit it the one that names most of it, then the newest. One
 * for a range of build dates fits no unit whose build date isn't known.
 *
 * @param limits those that stand, in any order
 * @returns by the check's id; of each the limit itself, not whom else it is for, since that is what a judgement keeps
 * @example limitsFor([{ ...any, most: 25 }, { ...ofBuses, most: 40 }], bus).get('build-up-time') // ofBuses
 */
export function limitsFor(limits: readonly AdoptedLimit[], unit: LimitFacts): Map<string, Limit> {
  const held = new Map<string, AdoptedLimit>();
  for (const limit of limits) {
    const other = held.get(limit.checkId);
    if (fits(limit, unit) && (!other || goesBefore(limit, other))) held.set(limit.checkId, limit);
  }
  return new Map([...held].map(([checkId, { id, least, most, below, source }]) => [checkId, { id, checkId, least, most, below, source }]));
}

function goesBefore(a: AdoptedLimit, b: AdoptedLimit): boolean {
  const more = weightOf(a) - weightOf(b) || a.adoptedAt.getTime() - b.adoptedAt.getTime();
  return more === 0 ? a.id > b.id : more > 0;
}
