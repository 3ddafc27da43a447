import type { GateOutcome } from '@/lib/services/gate/outcome';

type Share = GateOutcome['gated']['comebacks'];
type Difference = GateOutcome['comebackDifference'];

const percent = (share: number) => `${(100 * share).toFixed(0)} %`;

/** "12 of 40: 30 % (18 to 45 %)"; fewer than five are counted alone. */
export function shareText(share: Share): string {
  if (share.kind === 'nothing-counted') return 'None to count';
  if (share.kind === 'at-most') return `0 of ${share.of}: at most ${percent(share.upper)}`;
  if (share.kind === 'count-alone') return `${share.count} of ${share.of}`;
  return `${share.count} of ${share.of}: ${percent(share.share)} (${percent(share.limits.lower)} to ${percent(share.limits.upper)})`;
}

/** In points of a percentage, gated less ungated. */
export function differenceText(what: string, difference: Difference): string {
  if (!difference) return `${what}: too few on one side to compare; from five on each it is.`;
  const points = (value: number) => `${value < 0 ? '−' : '+'}${Math.abs(100 * value).toFixed(0)}`;
  const { lower, upper } = difference.limits;
  const decided = lower > 0 ? 'more with the gate' : upper < 0 ? 'fewer with the gate' : 'no difference can be told';
  return `${what}: ${points(difference.difference)} percentage points (${points(lower)} to ${points(upper)}), ${decided}.`;
}
