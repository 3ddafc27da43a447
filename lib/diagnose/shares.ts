import type { CompiledCheck } from './compiled';
import { FindingError } from './errors';
import type { Answer, StateShare } from './types';

/**
 * Turns an answer into shares of a check's states. A measured value falls in half-open bands [low, high); with an
 * instrument error e the share of a band is the part of [x - e, x + e] that lies in it.
 *
 * @param check from `compiled.checks`
 * @param answer what a person answered; a measured value and its error are SI
 * @returns shares that sum to 1, lower bands first, and the reliability: 1 for sure, the check's for "think so". No
 * shares for "can't tell" and "skip", which add nothing.
 * @throws FindingError for an unknown state, a value out of range or not finite, a negative error, or an answer of
 * the wrong kind
 * @example sharesOf(check, { kind: 'measured', value: 48, error: 1, sureness: 'sure' })
 */
export function sharesOf(check: CompiledCheck, answer: Answer): { shares: StateShare[]; reliability: number } {
  if (answer.kind === 'cannot-tell' || answer.kind === 'skip') return { shares: [], reliability: 1 };
  const reliability = answer.sureness === 'sure' ? 1 : check.reliability;
  if (answer.kind === 'measured') return { shares: bandShares(check, answer.value, answer.error), reliability };
  if (check.check.kind === 'measured') {
    throw new FindingError('wrong-kind', check.id, `"${check.id}" is measured: it needs a value, not an answer`);
  }
  if (!check.stateIndex.has(answer.state)) {
    throw new FindingError('unknown-state', check.id, `"${check.id}" has no answer "${answer.state}", only ${check.stateIds.join(', ')}`);
  }
  return { shares: [{ state: answer.state, share: 1 }], reliability };
}

function bandShares({ id, check }: CompiledCheck, value: number, error: number): StateShare[] {
  if (check.kind !== 'measured') throw new FindingError('wrong-kind', id, `"${id}" is not measured: it needs an answer, not a value`);
  const { min, max } = check.range ?? { min: -Infinity, max: Infinity };
  if (!Number.isFinite(value) || value < min || value > max) {
    throw new FindingError('out-of-range', id, `${value} is out of the range of "${id}", ${min} to ${max}`);
  }
  if (!Number.isFinite(error) || error < 0) {
    throw new FindingError('bad-error', id, `the error of "${id}" is ${error}; it must be 0 or more`);
  }
  const overlaps = check.states.map(({ id: state, low = -Infinity, high = Infinity }) => ({
    state,
    overlap: Math.max(0, Math.min(value + error, high) - Math.max(value - error, low)),
    holds: value >= low && value < high,
  }));
  // Divided by what was found and not by 2e: an error far smaller than the value is lost in rounding.
  const width = overlaps.reduce((sum, { overlap }) => sum + overlap, 0);
  if (width === 0) return overlaps.filter(({ holds }) => holds).map(({ state }) => ({ state, share: 1 }));
  return overlaps.filter(({ overlap }) => overlap > 0).map(({ state, overlap }) => ({ state, share: overlap / width }));
}
