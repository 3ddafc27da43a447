import fc from 'fast-check';
import { SOMETHING_ELSE, STATION_IDS, type Cause, type Check, type Condition, type Finding, type Rule, type Rulebook } from '@/lib/diagnose';
import { book, cause, choice, finding, measured } from './rulebook-parts';
import { seededRandom, type Random } from './random';

/** What a random case is to have; fast-check varies and shrinks these, the seed fills in the rest. */
export interface RandomShape {
  seed: number;
  causes: number;
  checks: number;
  /** Compound rules at most. */
  compounds: number;
  /** Evidence groups that checks are put in; 0: every check is a group of its own. */
  groups: number;
  /** Most answers of a check, 2 to 5. */
  states: number;
  /** Share of the measured findings that are split over bands. */
  split: number;
  beta: number;
  rho: number;
}

export interface RandomCase {
  rulebook: Rulebook;
  findings: Finding[];
}

/** Which of the harder things a case has in it; the properties assert their mix. */
export interface CaseFeatures {
  compoundRules: boolean;
  threeStates: boolean;
  groupOfThree: boolean;
  splitAnswers: boolean;
}

/** Random coherent rulebooks with findings. Narrow it by fixing parts of the shape. */
export function randomCases(fixed: Partial<RandomShape> = {}): fc.Arbitrary<RandomCase> {
  return fc
    .record({
      seed: fc.integer({ min: 0, max: 2 ** 31 }),
      causes: fc.integer({ min: 2, max: 7 }),
      checks: fc.integer({ min: 3, max: 9 }),
      compounds: fc.integer({ min: 0, max: 4 }),
      groups: fc.constantFrom(0, 1, 1, 2),
      states: fc.integer({ min: 2, max: 5 }),
      split: fc.constantFrom(0, 0.5, 1),
      beta: fc.constantFrom(0.3, 0.8, 1, 1, 1.5),
      rho: fc.constantFrom(0, 0.25, 0.5, 0.5, 0.9, 1),
    })
    .map((shape) => caseOf({ ...shape, ...fixed }));
}

/** The case of one shape, always the same. */
export function caseOf(shape: RandomShape): RandomCase {
  const random = seededRandom(shape.seed);
  const causes = randomCauses(random, shape.causes);
  const groupIds = Array.from({ length: shape.groups }, (_, index) => `group-${index}`);
  const checks = Array.from({ length: shape.checks }, (_, index) => randomCheck(random, `check-${index}`, shape.states));
  const rules = [
    ...checks.flatMap((check) => tableRules(random, check, causes, random.chance(0.85) && groupIds.length > 0 ? random.pick(groupIds) : undefined)),
    ...Array.from({ length: shape.compounds }, (_, index) => compoundRule(random, `compound ${index}`, checks, causes, groupIds)),
  ];
  const rulebook = book({ causes, checks, rules, evidenceGroups: groupIds.map((id, index) => ({ id, name: id, ...(index === 0 ? {} : { rho: random.unit() }) })) });
  rulebook.settings.beta = shape.beta;
  rulebook.settings.defaultRho = shape.rho;
  return { rulebook, findings: checks.flatMap((check) => (random.chance(0.75) ? [randomFinding(random, check, shape.split)] : [])) };
}

function randomCauses(random: Random, count: number): Cause[] {
  const shares = randomShares(random, count + 1);
  return [SOMETHING_ELSE, ...Array.from({ length: count }, (_, index) => `cause-${index}`)].map((id, index) =>
    cause(id, shares[index] ?? 0, { station: id === SOMETHING_ELSE || random.chance(0.2) ? null : random.pick(STATION_IDS) }),
  );
}

/** Shares that sum to 1, none of them tiny. */
function randomShares(random: Random, count: number): number[] {
  const parts = Array.from({ length: count }, () => 0.05 + random.unit());
  const sum = parts.reduce((a, b) => a + b, 0);
  return parts.map((part) => part / sum);
}

function randomCheck(random: Random, id: string, mostStates: number): Check {
  const backgrounds = randomShares(random, 2 + random.below(mostStates - 1));
  const more = { minutes: 1 + random.below(20), cannotTell: random.chance(0.3) ? 0.2 : 0, ...(random.chance(0.2) ? { reliability: 0.6 } : {}) };
  if (random.chance(0.5)) return choice(id, Object.fromEntries(backgrounds.map((background, index) => [`state-${index}`, background])), more);
  const edges = backgrounds.slice(1).map((_, index) => 100 * (index + 1));
  return measured(id, edges, backgrounds, more);
}

/** The table rules of one check: its answers in blocks, most blocks with a rule, each cause with weights in some. */
function tableRules(random: Random, check: Check, causes: readonly Cause[], group: string | undefined): Rule[] {
  const blocks = blocksOf(random, check);
  const weights = blocks.map((): Record<string, number> => ({}));
  for (const { id } of causes) {
    if (id === SOMETHING_ELSE || random.chance(0.4)) continue;
    const chances = randomShares(random, check.states.length).map((share) => share ** 2);
    const sum = chances.reduce((a, b) => a + b, 0);
    const everyAnswer = random.chance(0.2);
    // Where every answer is given, the table may be off by less than a hundredth and is normalised.
    const off = everyAnswer ? random.between(0.992, 1.008) : 1;
    blocks.forEach((block, index) => {
      const blockWeights = weights[index];
      if (!blockWeights || (!everyAnswer && (index === 0 || random.chance(0.3)))) return;
      const chance = block.reduce((total, state) => total + (chances[state] ?? 0) / sum, 0);
      const background = block.reduce((total, state) => total + (check.states[state]?.background ?? 0), 0);
      blockWeights[id] = 10 * Math.log10((off * chance) / background);
    });
  }
  return blocks.flatMap((block, index) => {
    const given = weights[index] ?? {};
    if (Object.keys(given).length === 0) return [];
    return [
      {
        name: `${check.id} ${block.join(' ')}`,
        conditions: { all: [conditionFor(random, check, block)] },
        weights: given,
        ...(group === undefined ? {} : { group }),
        note: 'Made up.',
        basis: 'judgement' as const,
      },
    ];
  });
}

/** The states of a check in two or more blocks, in random order; those of a measured check stay neighbours. */
function blocksOf(random: Random, check: Check): number[][] {
  const states = check.states.map((_, index) => index);
  const order = check.kind === 'measured' ? states : random.shuffle(states);
  const [first, ...rest] = order;
  const blocks: number[][] = [[first ?? 0]];
  rest.forEach((state, index) => {
    const last = blocks.at(-1);
    const mustSplit = index === rest.length - 1 && blocks.length === 1;
    if (!last || mustSplit || random.chance(0.6)) blocks.push([state]);
    else last.push(state);
  });
  return random.shuffle(blocks);
}

/** A condition that holds in exactly these states, in one of the ways in which it can be written. */
function conditionFor(random: Random, check: Check, block: readonly number[]): Condition {
  if (check.kind === 'measured') {
    const low = check.states[Math.min(...block)]?.low;
    const high = check.states[Math.max(...block)]?.high;
    const parts: Condition[] = [];
    if (low !== undefined) parts.push({ fact: check.id, operator: 'greaterThanInclusive', value: low });
    if (high !== undefined) parts.push({ fact: check.id, operator: 'lessThan', value: high });
    return { all: parts };
  }
  const inside = block.map((index) => check.states[index]?.id ?? '');
  const outside = check.states.map(({ id }) => id).filter((id) => !inside.includes(id));
  const [only = ''] = inside;
  const [other = ''] = outside;
  const ways: Condition[] = [
    { fact: check.id, operator: 'in', value: inside },
    { fact: check.id, operator: 'notIn', value: outside },
    { any: inside.map((value): Condition => ({ fact: check.id, operator: 'equal', value })) },
  ];
  if (inside.length === 1) ways.push({ fact: check.id, operator: 'equal', value: only });
  if (outside.length === 1) ways.push({ fact: check.id, operator: 'notEqual', value: other });
  return random.pick(ways);
}

function compoundRule(random: Random, name: string, checks: readonly Check[], causes: readonly Cause[], groupIds: readonly string[]): Rule {
  const parts = random
    .shuffle(checks)
    .slice(0, 2 + random.below(2))
    .map((check) => conditionFor(random, check, random.pick([blocksOf(random, check)[0] ?? [0]])));
  const named = random.shuffle(causes.filter(({ id }) => id !== SOMETHING_ELSE)).slice(0, 1 + random.below(2));
  return {
    name,
    conditions: random.chance(0.3) ? { any: parts } : { all: parts },
    weights: Object.fromEntries(named.map(({ id }) => [id, random.between(-10, 10)])),
    ...(groupIds.length > 0 && random.chance(0.4) ? { group: random.pick(groupIds) } : {}),
    note: 'Made up.',
    basis: 'judgement',
  };
}

/** A finding for a check: sure, thought so, split over neighbouring bands, or nothing at all. */
export function randomFinding(random: Random, check: Check, split: number): Finding {
  const reliability = random.chance(0.3) ? (check.reliability ?? 0.8) : 1;
  if (random.chance(0.1)) return finding(check.id, {});
  if (check.kind === 'measured' && random.chance(split)) {
    const width = 2 + random.below(check.states.length - 1);
    const from = random.below(check.states.length - width + 1);
    const shares = random.chance(0.1) ? Array.from({ length: width }, () => 1 / width) : randomShares(random, width);
    return finding(check.id, Object.fromEntries(shares.map((share, index) => [check.states[from + index]?.id ?? '', share])), { reliability });
  }
  return finding(check.id, random.pick(check.states).id, { reliability });
}

/** What a case has in it. */
export function featuresOf({ rulebook, findings }: RandomCase): CaseFeatures {
  const mentioned = rulebook.rules.map(({ conditions }) => new Set(JSON.stringify(conditions).match(/check-\d+/g)));
  const inGroup = new Map<string, Set<string>>();
  rulebook.rules.forEach(({ group }, index) => {
    const [only] = mentioned[index] ?? [];
    if (group === undefined || mentioned[index]?.size !== 1 || only === undefined) return;
    inGroup.set(group, (inGroup.get(group) ?? new Set()).add(only));
  });
  return {
    compoundRules: mentioned.some((checks) => checks.size > 1),
    threeStates: rulebook.checks.some(({ states }) => states.length >= 3),
    groupOfThree: [...inGroup.values()].some((checks) => checks.size >= 3),
    splitAnswers: findings.some(({ shares }) => shares.length > 1),
  };
}
