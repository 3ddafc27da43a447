import type { CompiledRulebook } from './compiled';
import type { PriorVariant, RecordFacts } from './types';

/**
 * The priors for a case: those of the first variant whose facts all hold, or the rulebook's own. A variant replaces
 * the priors it names; the others keep their proportions and share what is left.
 *
 * @param compiled the rulebook
 * @param facts what unit, model and fit know; a fact that is not there makes its variant not hold
 * @returns prior by cause, in the order of `causeIds`; they sum to 1
 * @example priorsFor(compiled, { 'fit.distance': 100_000 })
 */
export function priorsFor(compiled: CompiledRulebook, facts: RecordFacts): Float64Array {
  const known = new Map(Object.entries(facts));
  const variant = compiled.rulebook.priorVariants?.find(({ when }) =>
    Object.entries(when).every(([fact, wanted]) => matches(known.get(fact), wanted)),
  );
  if (!variant) return compiled.priors;
  const named = new Map(Object.entries(variant.priors));
  const share = { named: 0, others: 0 };
  compiled.causeIds.forEach((id, cause) => {
    const own = named.get(id);
    if (own === undefined) share.others += compiled.priors[cause] ?? 0;
    else share.named += own;
  });
  const scale = share.others > 0 ? (1 - share.named) / share.others : 0;
  return compiled.priors.map((prior, cause) => named.get(compiled.causeIds[cause] ?? '') ?? prior * scale);
}

function matches(found: string | number | undefined, wanted: PriorVariant['when'][string]): boolean {
  if (found === undefined || typeof wanted === 'string') return found === wanted;
  const { atLeast = -Infinity, below = Infinity } = wanted;
  return typeof found === 'number' && found >= atLeast && found < below;
}
