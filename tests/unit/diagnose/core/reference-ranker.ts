import type { Condition, Finding, Rulebook } from '@/lib/diagnose';

/**
 * The model of `diagnosis.md` written down once more, as plainly as it can be: products of probabilities, no indexes,
 * no logarithms but the one in W, and nothing imported from the code that it checks. Slow, and it overflows.
 */
export function referencePosterior(book: Rulebook, findings: readonly Finding[]): Map<string, number> {
  const answered = findings.filter(({ shares }) => shares.length > 0);
  const unnormalised = book.causes.map(({ id, prior }) => {
    const groups = new Map<string, { rho: number; weights: number[] }>();
    const put = (named: string | undefined, own: string, weight: number) => {
      const key = named ?? own;
      const rho = book.evidenceGroups.find((group) => group.id === named)?.rho ?? book.settings.defaultRho;
      groups.set(key, { rho, weights: [...(groups.get(key)?.weights ?? []), weight] });
    };
    for (const { checkId, shares, reliability } of answered) {
      const ratio = shares.reduce((sum, { state, share }) => sum + share * ratioOf(book, id, checkId, state), 0);
      const group = book.rules.find((rule) => mentions(rule.conditions).size === 1 && mentions(rule.conditions).has(checkId))?.group;
      put(group, `check ${checkId}`, Math.log(reliability * ratio + 1 - reliability));
    }
    for (const rule of book.rules) {
      const checks = mentions(rule.conditions);
      if (checks.size === 1 || !holds(book, rule.conditions, largestShares(book, answered))) continue;
      const sureness = answered.filter(({ checkId }) => checks.has(checkId)).reduce((product, { reliability }) => product * reliability, 1);
      put(rule.group, `rule ${rule.name}`, Math.log(sureness * 10 ** ((rule.weights[id] ?? 0) / 10) + 1 - sureness));
    }
    const evidence = [...groups.values()].reduce((sum, { rho, weights }) => sum + attenuated(weights, rho), 0);
    return { id, value: prior * Math.exp(book.settings.beta * evidence) };
  });
  const total = unnormalised.reduce((sum, { value }) => sum + value, 0);
  return new Map(unnormalised.map(({ id, value }) => [id, value / total]));
}

/** P(state | cause) / background: given, or filled in so that the answers' chances sum to 1. */
function ratioOf(book: Rulebook, causeId: string, checkId: string, state: string): number {
  const check = book.checks.find(({ id }) => id === checkId);
  if (!check) throw new Error(`no check ${checkId}`);
  const given = check.states.map(({ id, background }) => {
    const rule = book.rules.find(
      ({ conditions, weights }) =>
        mentions(conditions).size === 1 && causeId in weights && holds(book, conditions, new Map([[checkId, id]])),
    );
    const decibans = rule?.weights[causeId];
    return { id, background, ratio: decibans === undefined ? undefined : 10 ** (decibans / 10) };
  });
  const told = given.filter(({ ratio }) => ratio !== undefined);
  const sum = told.reduce((total, { background, ratio }) => total + background * (ratio ?? 0), 0);
  const known = told.reduce((total, { background }) => total + background, 0);
  const own = given.find(({ id }) => id === state)?.ratio;
  if (told.length === given.length) return (own ?? 0) / sum;
  return own ?? (1 - sum) / (1 - known);
}

function attenuated(weights: readonly number[], rho: number): number {
  const side = (sizes: number[]) => sizes.sort((a, b) => b - a).reduce((sum, size, j) => sum + (j === 0 ? 1 : rho ** j) * size, 0);
  return side(weights.filter((weight) => weight > 0)) - side(weights.filter((weight) => weight < 0).map((weight) => -weight));
}

function largestShares(book: Rulebook, answered: readonly Finding[]): Map<string, string> {
  return new Map(
    answered.map(({ checkId, shares }) => {
      const order = book.checks.find(({ id }) => id === checkId)?.states.map(({ id }) => id) ?? [];
      const most = Math.max(...shares.map(({ share }) => share));
      const [lowest = ''] = shares.filter(({ share }) => share === most).map(({ state }) => state).sort((a, b) => order.indexOf(a) - order.indexOf(b));
      return [checkId, lowest];
    }),
  );
}

function mentions(condition: Condition): Set<string> {
  if ('fact' in condition) return new Set([condition.fact]);
  const parts = 'all' in condition ? condition.all : condition.any;
  return new Set(parts.flatMap((part) => [...mentions(part)]));
}

function holds(book: Rulebook, condition: Condition, states: ReadonlyMap<string, string>): boolean {
  if ('all' in condition) return condition.all.every((part) => holds(book, part, states));
  if ('any' in condition) return condition.any.some((part) => holds(book, part, states));
  const id = states.get(condition.fact);
  const state = book.checks.find((check) => check.id === condition.fact)?.states.find((each) => each.id === id);
  if (!state) return false;
  const listed = [condition.value].flat();
  switch (condition.operator) {
    case 'equal':
    case 'in':
      return listed.includes(state.id);
    case 'notEqual':
    case 'notIn':
      return !listed.includes(state.id);
    case 'lessThan':
      return state.high !== undefined && state.high <= Number(condition.value);
    case 'greaterThanInclusive':
      return state.low !== undefined && state.low >= Number(condition.value);
  }
}
