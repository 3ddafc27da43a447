import type { CompiledCheck, CompiledRulebook, Ranking } from '@/lib/diagnose';
import { likelihoods } from '@/lib/diagnose/information';
import { LEAST_MINUTES } from '@/lib/diagnose/next-checks';
import { minutesToGo, type VehicleState } from '@/lib/diagnose/set-up';

/** A check whose evidence is worth so much is not spoiled for another. */
const WORTH_KEEPING_BITS = 0.12;

export interface Suggested {
  check: CompiledCheck;
  bits: number;
  bitsPerMinute: number;
}

/** The open checks of a case, that which tells most for its minutes first. */
export type Policy = (now: { ranking: Ranking; closed: ReadonlySet<string>; vehicle: VehicleState }) => Suggested[];

/**
 * The product's order of checks (lib/diagnose/next-checks) as far as thousands of simulated steps can afford it: bits
 * per minute from where the vehicle stands, nothing spoiled that is worth keeping. Attenuation, pairs and money are
 * left out.
 */
export function policyOf(compiled: CompiledRulebook): Policy {
  const tables = [...compiled.checks.values()].map((check) => {
    const likely = likelihoods(check.backgrounds, check.table);
    // What the answer is still uncertain by when the cause is known, bits by cause.
    const noise = compiled.causeIds.map((_, c) => likely.reduce((sum, row) => sum + entropyPart(row[c] ?? 0), 0));
    return { check, likely, noise };
  });
  const { setUpMinutes } = compiled.settings;
  return ({ ranking, closed, vehicle }) => {
    const p = new Float64Array(compiled.causeIds.length);
    for (const cause of ranking.causes) p[compiled.causeIndex.get(cause.causeId) ?? 0] = cause.p;
    const open = tables
      .filter(({ check }) => !closed.has(check.id))
      .map(({ check, likely, noise }) => {
        const bits = likely.reduce((sum, row) => sum + entropyPart(dot(p, row)), 0) - dot(p, noise);
        const minutes = check.check.minutes + minutesToGo(vehicle, check.check.setUp, setUpMinutes);
        return { check, bits, bitsPerMinute: ((1 - check.check.cannotTell) * bits) / Math.max(LEAST_MINUTES, minutes) };
      });
    const keep = new Set(open.filter(({ bits }) => bits > WORTH_KEEPING_BITS).map(({ check }) => check.id));
    return open
      .filter(({ check }) => !check.check.spoils.some((id) => keep.has(id)))
      .sort((a, b) => b.bitsPerMinute - a.bitsPerMinute || (a.check.id < b.check.id ? -1 : 1));
  };
}

const entropyPart = (p: number) => (p > 0 ? -p * Math.log2(p) : 0);

function dot(a: ArrayLike<number>, b: ArrayLike<number>): number {
  let sum = 0;
  for (let i = 0; i < a.length; i += 1) sum += (a[i] ?? 0) * (b[i] ?? 0);
  return sum;
}
