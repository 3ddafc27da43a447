import { attenuationFactors } from './attenuation';
import type { CompiledRulebook } from './compiled';
import { evidenceItems, firedByPredicates, type EvidenceItem } from './evidence';
import { posteriorOf } from './log-sum-exp';
import { priorsFor } from './priors';
import type { RecordFacts } from './types';
import type { UsedFinding } from './used-findings';

/**
 * The ranking without each finding in turn, all the rest as it is: what `rank` gives for the others, to the last bit.
 * Only the evidence groups that a finding has a part in are attenuated anew: its own, and those of the compound rules
 * that look at its check.
 *
 * @param compiled the rulebook
 * @param used the findings that count, from `usedFindings`
 * @param facts as for `rank`
 * @returns p_c by finding id, in the order of `causeIds`
 * @example leaveOneOut(compiled, usedFindings(compiled, findings)).get(findings[0].id)
 */
export function leaveOneOut(compiled: CompiledRulebook, used: readonly UsedFinding[], facts: RecordFacts = {}): Map<string, Float64Array> {
  const logPriors = priorsFor(compiled, facts).map((prior) => Math.log(prior));
  const items = itemsOf(compiled, used);
  const counted = new Map<string, Float64Array>();
  for (const group of byGroup(items).values()) count(group, compiled, counted);

  return new Map(
    used.map((left) => {
      const looking = compiled.compoundRules.filter(({ checkIds }) => checkIds.includes(left.check.id));
      // Where no compound rule looks at the check, the other items are what they were.
      const rest = looking.length === 0
        ? items.filter(({ findingIds }) => !findingIds.includes(left.finding.id))
        : itemsOf(compiled, used.filter((other) => other !== left));
      const touched = new Set([left.check.group.id, ...looking.map(({ group }) => group.id)]);
      const anew = new Map<string, Float64Array>();
      for (const [id, group] of byGroup(rest)) if (touched.has(id)) count(group, compiled, anew);

      const scores = Float64Array.from(logPriors);
      // Added up item by item, as `rank` does, so that both give the same bits.
      for (const item of rest) {
        const nats = anew.get(keyOf(item)) ?? counted.get(keyOf(item));
        nats?.forEach((weight, cause) => (scores[cause] = (scores[cause] ?? 0) + weight));
      }
      return [left.finding.id, posteriorOf(scores)];
    }),
  );
}

const itemsOf = (compiled: CompiledRulebook, used: readonly UsedFinding[]) => evidenceItems(compiled, used, firedByPredicates(compiled, used));

/** Of one case: a check's table gives one item, a compound rule one. */
const keyOf = ({ kind, checkIds, rules }: EvidenceItem) => (kind === 'table' ? `check ${checkIds[0]}` : `rule ${rules[0]?.name}`);

function byGroup(items: readonly EvidenceItem[]): Map<string, EvidenceItem[]> {
  const groups = new Map<string, EvidenceItem[]>();
  for (const item of items) {
    const held = groups.get(item.group.id);
    if (held) held.push(item);
    else groups.set(item.group.id, [item]);
  }
  return groups;
}

/** What counts of each item of one group, by cause: beta times what attenuation leaves, nats. */
function count(group: readonly EvidenceItem[], { causeIds, settings }: CompiledRulebook, into: Map<string, Float64Array>): void {
  const rho = group[0]?.group.rho ?? 1;
  const shares = group.map(() => new Float64Array(causeIds.length));
  causeIds.forEach((_, cause) => {
    const telling = group.flatMap(({ nats }, i) => (nats[cause] ? [{ i, weight: nats[cause] }] : []));
    attenuationFactors(telling.map(({ weight }) => weight), rho).forEach((factor, k) => {
      const { i, weight } = telling[k] ?? { i: -1, weight: 0 };
      const share = shares[i];
      if (share) share[cause] = settings.beta * factor * weight;
    });
  });
  group.forEach((item, i) => into.set(keyOf(item), shares[i] ?? new Float64Array()));
}
