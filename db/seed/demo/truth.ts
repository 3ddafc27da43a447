import { SOMETHING_ELSE, natsOf, type CompiledCheck, type CompiledRulebook } from '@/lib/diagnose';
import { randomFrom, type Random } from './random';

/** How far the weights of the demo's world may be off the rulebook's, decibans either way. */
export const PERTURBED_BY_DECIBANS = 3;

/** A listed cause by its id, or one that no rulebook lists, by its name in `unlisted.ts`. */
export type TrueCause = { listed: string } | { unlisted: string };

/**
 * The world that the demo's answers are drawn from: the default rulebook's tables with every weight moved at random,
 * each cause's answers made to add up to one again. What the rulebook says is nearly right, and nowhere quite.
 */
export class Truth {
  private readonly tables = new Map<string, Float64Array>();

  constructor(
    private readonly compiled: CompiledRulebook,
    private readonly seed = 'truth',
  ) {}

  /** P(answer | cause) of each answer of a check, in the order of its states. */
  chances(check: CompiledCheck, cause: TrueCause): Float64Array {
    const name = 'listed' in cause ? cause.listed : `unlisted: ${cause.unlisted}`;
    const key = `${check.id} ${name}`;
    const known = this.tables.get(key);
    if (known) return known;
    const random = randomFrom(`${this.seed}/${key}`);
    const chances = 'listed' in cause ? this.ofListed(check, cause.listed, random) : moved(check.backgrounds, check.backgrounds.map(() => 0), random);
    this.tables.set(key, chances);
    return chances;
  }

  /** The answer that speaks most for a cause among checks that somebody can go and look at. */
  mostTelling(causeId: string, checks: Iterable<CompiledCheck>): { checkId: string; state: string } | undefined {
    const cause = this.compiled.causeIndex.get(causeId) ?? -1;
    let best: { checkId: string; state: string; nats: number } | undefined;
    for (const check of checks) {
      check.table.forEach((row, v) => {
        const nats = row[cause] ?? 0;
        // An answer that is rare even with the cause settles nothing when it isn't given.
        const isUsual = (this.chances(check, { listed: causeId })[v] ?? 0) >= 0.5;
        if (isUsual && nats > (best?.nats ?? natsOf(6))) best = { checkId: check.id, state: check.stateIds[v] ?? '', nats };
      });
    }
    return best;
  }

  private ofListed(check: CompiledCheck, causeId: string, random: Random): Float64Array {
    const cause = this.compiled.causeIndex.get(causeId);
    if (cause === undefined) throw new Error(`the rulebook has no cause ${causeId}`);
    const weights = check.table.map((row) => row[cause] ?? 0);
    const saysNothing = causeId === SOMETHING_ELSE || weights.every((weight) => weight === 0);
    return saysNothing ? Float64Array.from(check.backgrounds) : moved(check.backgrounds, weights, random);
  }
}

/** b e^(w + up to 3 dB either way), over its sum. */
function moved(backgrounds: readonly number[], weights: readonly number[], random: Random): Float64Array {
  const most = natsOf(PERTURBED_BY_DECIBANS);
  const raw = backgrounds.map((background, v) => background * Math.exp((weights[v] ?? 0) + random.between(-most, most)));
  const sum = raw.reduce((total, each) => total + each, 0);
  return Float64Array.from(raw, (each) => each / sum);
}
