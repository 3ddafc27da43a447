import { NORMAL_CARRYOVER, SOMETHING_ELSE } from '@/lib/diagnose';
import type { Term } from '@/lib/schemas/terms';
import type { Random } from './random';

/** Causes that sit in the compressor itself: another one takes them away, whatever was thought. */
const IN_THE_COMPRESSOR = new Set([
  'rings-worn',
  'rings-not-seated',
  'valve-leaking',
  'head-gasket-failed',
  'unloader-stuck',
  'crank-or-bearing-failed',
  'drive-gear-failed',
  'intake-dirt-ingested',
]);

/** How often naming a cause ends in another compressor. */
const REPLACES: Record<string, number> = {
  'rings-worn': 0.9,
  'rings-not-seated': 0.25,
  'valve-leaking': 0.6,
  'head-gasket-failed': 0.45,
  'unloader-stuck': 0.3,
  'crank-or-bearing-failed': 1,
  'drive-gear-failed': 0.6,
  'intake-dirt-ingested': 0.85,
  'oil-feed-restricted': 0.6,
  'coolant-starved': 0.25,
  'drain-choked-by-sealant': 0.15,
  'discharge-line-carboned': 0.15,
  [SOMETHING_ELSE]: 0.2,
};
const REPLACES_ANYWAY = 0.06;
const CURED_AS_MEANT = 0.96;
const CURED_BY_LUCK = 0.25;

export interface Repair {
  replaced: boolean;
  /** For the record of the compressor that came out. */
  whyOut: Term<'whyOut'>;
  /** What is still there, and will show again. */
  left: string[];
}

/** What is done about a cause that was named, and which of the true causes it leaves where they were. */
export function repair(named: readonly string[], trueCauses: readonly string[], random: Random): Repair {
  const [main = ''] = named;
  const replaced = random.chance(REPLACES[main] ?? REPLACES_ANYWAY);
  const failed = trueCauses.some((id) => IN_THE_COMPRESSOR.has(id));
  const isCured = (id: string) =>
    id === NORMAL_CARRYOVER || (replaced && IN_THE_COMPRESSOR.has(id)) || (named.includes(id) ? random.chance(CURED_AS_MEANT) : random.chance(CURED_BY_LUCK));
  return {
    replaced,
    whyOut: random.weighted(
      failed ? { 'failed-seen': 70, 'not-the-cause': 2, precaution: 8, unknown: 20 } : { 'failed-seen': 4, 'not-the-cause': 52, precaution: 12, unknown: 32 },
    ),
    left: trueCauses.filter((id) => !isCured(id)),
  };
}
