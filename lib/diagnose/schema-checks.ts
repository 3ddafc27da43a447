import type { Problem } from './errors';
import { pathText } from './schema-limits';
import { SUM_WITHIN } from './schema-references';
import type { ShapedRulebook } from './schema-shape';

type ShapedCheck = ShapedRulebook['checks'][number];
type Add = (path: readonly PropertyKey[], message: string, instead: string) => void;

const MEASURED_ONLY = ['quantity', 'unit', 'usualError', 'range', 'sum', 'compares'] as const;

/**
 * What each check must be in itself: answers that exclude each other and leave nothing out, each with its share of
 * all cases.
 *
 * @param book a rulebook of the right shape
 * @returns every problem found
 */
export function checkProblems(book: ShapedRulebook): Problem[] {
  const found: Problem[] = [];
  book.checks.forEach((check, index) => {
    const add: Add = (path, message, instead) => found.push({ path: pathText(['checks', index, ...path]), message, instead });
    const sum = check.states.reduce((total, { background }) => total + background, 0);
    if (Math.abs(sum - 1) > SUM_WITHIN) {
      add(['states'], `the background rates of "${check.id}" sum to ${Number(sum.toFixed(6))}, not to 1`, 'change them so that they sum to 1');
    }
    if (check.states.every(({ holdsRelease }) => holdsRelease)) {
      add(['states'], `every answer of "${check.id}" holds the release, so that nothing could ever pass it`, 'leave "holdsRelease" out of the answers that pass');
    }
    if (check.kind === 'measured') measuredProblems(check, add);
    else choiceProblems(check, add);
    recordProblems(check, add);
  });
  return found;
}

function choiceProblems(check: ShapedCheck, add: Add): void {
  for (const key of MEASURED_ONLY) {
    if (check[key] !== undefined) add([key], `"${check.id}" is a choice, which has no "${key}"`, 'leave it out, or make the check measured');
  }
  check.states.forEach(({ low, high }, index) => {
    if (low !== undefined || high !== undefined) add(['states', index], 'an answer of a choice has no band', 'leave "low" and "high" out');
  });
}

function measuredProblems(check: ShapedCheck, add: Add): void {
  const { states, range } = check;
  if (check.quantity === undefined) add(['quantity'], 'is missing: the check is measured', 'write what is measured ("pressure")');
  if (check.unit === undefined) add(['unit'], 'is missing: the check is measured', 'write the unit its bands were thought of in ("psi")');
  if (states[0]?.low !== undefined) add(['states', 0, 'low'], 'the first band must be open below', 'leave "low" out');
  if (states.at(-1)?.high !== undefined) add(['states', states.length - 1, 'high'], 'the last band must be open above', 'leave "high" out');
  states.forEach(({ id, low, high }, index) => {
    const above = states[index + 1];
    if (above) {
      if (high === undefined) add(['states', index, 'high'], `band "${id}" has no upper edge`, `write the lower edge of "${above.id}"`);
      else if (above.low === undefined) add(['states', index + 1, 'low'], `band "${above.id}" has no lower edge`, `write ${high}, the upper edge of "${id}"`);
      else if (above.low !== high) {
        const what = above.low > high ? 'leaves a gap above' : 'overlaps';
        add(['states', index + 1, 'low'], `band "${above.id}" ${what} "${id}"`, `write ${high}, the upper edge of "${id}"`);
      }
    }
    if (low !== undefined && high !== undefined && !(low < high)) {
      add(['states', index], `band "${id}" is empty: its edges are ${low} and ${high}`, 'write bands from low to high');
    }
  });
  if (!range) return;
  const edges = states.flatMap(({ low }) => low ?? []);
  if (!(range.min < range.max)) add(['range'], `the range from ${range.min} to ${range.max} holds nothing`, 'write "min" below "max"');
  else if (edges.some((edge) => edge <= range.min || edge > range.max)) {
    add(['range'], 'a band lies wholly out of the range', `write a range around the edges ${edges.join(', ')}`);
  }
}

function recordProblems(check: ShapedCheck, add: Add): void {
  const { fromRecord } = check;
  if (!fromRecord?.states) return;
  if (check.kind === 'measured') {
    return add(['fromRecord', 'states'], 'a measured check takes the record’s number', 'leave "states" out');
  }
  const known = new Set(check.states.map(({ id }) => id));
  for (const [text, state] of Object.entries(fromRecord.states)) {
    if (known.has(state)) continue;
    add(['fromRecord', 'states', text], `"${check.id}" has no answer "${state}"`, `write ${[...known].join(' or ')}`);
  }
}
