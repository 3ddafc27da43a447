import type { Problem } from './errors';
import { pathText } from './schema-limits';
import type { ShapedRulebook } from './schema-shape';

type Path = readonly PropertyKey[];

/**
 * What of a proof can't be so: checks, answers and causes that are not there, bands and times upside down, a cause that is
 * watched by two plans, and causes that are watched by none.
 *
 * @param book a rulebook of the right shape
 * @returns every problem found; none when the rulebook has no proof
 */
export function proofProblems({ proof, checks, causes, cautions }: Pick<ShapedRulebook, 'proof' | 'checks' | 'causes' | 'cautions'>): Problem[] {
  if (!proof) return [];
  const found: Problem[] = [];
  const add = (path: Path, message: string, instead: string) => found.push({ path: pathText(['proof', ...path]), message, instead });
  const statesOf = new Map(checks.map(({ id, states }) => [id, new Set(states.map((state) => state.id))]));
  const causeIds = new Set(causes.map(({ id }) => id));

  const needCheck = (id: string, path: Path) => {
    if (!statesOf.has(id)) add(path, `there is no check "${id}"`, 'write the id of a check of this rulebook');
  };
  const needStates = (check: string, states: readonly string[], path: Path) => {
    const known = statesOf.get(check);
    states.forEach((state, i) => {
      if (known && !known.has(state)) add([...path, i], `"${check}" has no answer "${state}"`, `write one of ${[...known].join(', ')}`);
    });
  };

  const needAnswers = ({ check, inOrder }: { check: string; inOrder: readonly string[] }, path: Path) => {
    needCheck(check, [...path, 'check']);
    needStates(check, inOrder, [...path, 'inOrder']);
  };
  const cautionIds = new Set(cautions.map(({ id }) => id));
  const needCautions = (ids: readonly string[], path: Path) =>
    ids.forEach((id, i) => {
      if (!cautionIds.has(id)) add([...path, i], `there is no caution "${id}"`, 'write the id of a caution of this rulebook');
    });

  const { fitting, breakIn, release, watch } = proof;
  needCautions(fitting.cautions, ['fitting', 'cautions']);
  needCautions(breakIn.cautions, ['breakIn', 'cautions']);
  const { aim, low, high } = breakIn.pressure;
  if (!(low < aim && aim < high)) add(['breakIn', 'pressure'], 'the pressure to hold is not within its band', 'write low, aim and high in this order');
  if (breakIn.duration.least > breakIn.duration.most) add(['breakIn', 'duration'], 'the least time is longer than the most', 'write the shorter one as least');

  release.checks.forEach((one, i) => needAnswers(one, ['release', 'checks', i]));
  release.oilDownstream.checks.forEach((one, i) => needAnswers(one, ['release', 'oilDownstream', 'checks', i]));
  release.oilDownstream.when.forEach(({ check, states }, i) => {
    needCheck(check, ['release', 'oilDownstream', 'when', i, 'check']);
    needStates(check, states, ['release', 'oilDownstream', 'when', i, 'states']);
  });

  const watched = new Map<string, string>();
  const seen = new Set<string>();
  watch.plans.forEach(({ id, causes: of, readings }, i) => {
    if (seen.has(id)) add(['watch', 'plans', i, 'id'], `"${id}" stands there twice`, 'give each its own');
    seen.add(id);
    of.forEach((cause, j) => {
      const path = ['watch', 'plans', i, 'causes', j];
      const before = watched.get(cause);
      if (!causeIds.has(cause)) add(path, `there is no cause "${cause}"`, 'write the id of a cause of this rulebook');
      else if (before !== undefined) add(path, `"${cause}" is watched by "${before}" already`, 'leave it out of one of the two');
      watched.set(cause, id);
    });
    readings.forEach((reading, j) => needAnswers(reading, ['watch', 'plans', i, 'readings', j]));
  });
  const forOthers = watch.plans.filter((plan) => plan.causes.length === 0).length;
  if (forOthers !== 1) add(['watch', 'plans'], `${forOthers === 0 ? 'no plan is' : 'several plans are'} for the causes that no other names`, 'leave the causes of exactly one plan empty');
  return found;
}
