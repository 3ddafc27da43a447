import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readRule, type Check, type Condition, type RootCondition } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { sentenceText } from '@/lib/rulebook/sentence/text';
import { toConditions, toSentence } from '@/lib/rulebook/sentence/sentence';
import { seededRandom, type Random } from '@/tests/support/random';
import { book, cause, choice, measured, rule, somethingElse } from '@/tests/support/rulebook-parts';

const checks = new Map(defaultRulebook.checks.map((check) => [check.id, check]));

function randomStatement(random: Random): Condition {
  const check = random.pick(defaultRulebook.checks);
  const states = check.states.map(({ id }) => id);
  if (check.kind === 'measured') {
    return { fact: check.id, operator: random.pick(['lessThan', 'greaterThanInclusive'] as const), value: random.pick(check.states.flatMap(({ low }) => low ?? [])) };
  }
  return random.chance(0.5)
    ? { fact: check.id, operator: random.pick(['equal', 'notEqual'] as const), value: random.pick(states) }
    : { fact: check.id, operator: random.pick(['in', 'notIn'] as const), value: random.shuffle(states).slice(0, 1 + random.below(states.length)) };
}

function randomConditions(random: Random, depth: number): RootCondition {
  const parts = Array.from({ length: 1 + random.below(4) }, (): Condition =>
    depth > 1 && random.chance(0.35) ? randomConditions(random, depth - 1) : randomStatement(random),
  );
  return random.chance(0.5) ? { all: parts } : { any: parts };
}

describe('a rule as a sentence', () => {
  it('is the rule’s JSON, there and back, for 1,000 random rules', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 ** 31 }), (seed) => {
        const conditions = randomConditions(seededRandom(seed), 5);
        const sentence = toSentence(conditions);
        expect(JSON.stringify(toConditions(sentence))).toBe(JSON.stringify(conditions));
        expect(toSentence(toConditions(sentence))).toEqual(sentence);
      }),
      { numRuns: 1000, seed: 20_260 },
    );
  });

  it('is so for every rule of the default rulebook', () => {
    for (const { conditions } of defaultRulebook.rules) expect(toConditions(toSentence(conditions))).toEqual(conditions);
  });

  it('reads as words, with brackets where and meets or', () => {
    const bore = measured('bore', [0.01, 0.013], [0.2, 0.3, 0.5], { name: 'Discharge line bore' });
    const noise = choice('noise', { knock: 0.5, hiss: 0.5 }, { name: 'Noise' });
    const text = (conditions: RootCondition) =>
      sentenceText(toSentence(conditions), new Map<string, Check>([['bore', bore], ['noise', noise]]), (_, si) => `${1000 * si} mm`);
    const below = { fact: 'bore', operator: 'lessThan', value: 0.01 } as const;
    const knock = { fact: 'noise', operator: 'notEqual', value: 'knock' } as const;
    const either = { fact: 'noise', operator: 'in', value: ['knock', 'hiss'] } satisfies Condition;
    expect(text({ all: [below, knock] })).toBe('Discharge line bore is below 10 mm and Noise is not knock');
    expect(text({ all: [below, { any: [knock, either] }] })).toBe('Discharge line bore is below 10 mm and (Noise is not knock or Noise is one of knock, hiss)');
    expect(text({ any: [{ all: [below] }, knock] })).toBe('Discharge line bore is below 10 mm or Noise is not knock');
    expect(checks.size).toBeGreaterThan(0);
  });
});

const sound = book({
  causes: [somethingElse(0.2), cause('worn', 0.8)],
  checks: [choice('noise', { knock: 0.2, none: 0.8 }), measured('pressure', [100, 200], [0.3, 0.4, 0.3])],
  rules: [rule('knock', { noise: 'knock' }, { worn: 3 })],
});
const knock = { fact: 'noise', operator: 'equal', value: 'knock' };
const low = { fact: 'pressure', operator: 'lessThan', value: 100 };
const plain = { ...rule('low', {}, { worn: 2 }), conditions: { all: [low] } };

/** json-rules-engine 7.3.1's traps, as `diagnosis.md` lists them. */
const TRAPS: [trap: string, json: unknown, message: RegExp, instead: RegExp][] = [
  ['an empty "all" is true', { ...plain, conditions: { all: [] } }, /always hold/, /at least one condition/],
  ['an empty "any" is true', { ...plain, conditions: { any: [] } }, /always hold/, /at least one condition/],
  ['an empty list further down', { ...plain, conditions: { all: [low, { any: [] }] } }, /always hold/, /at least one condition/],
  ['"any" beside "all": only "any" counts', { ...plain, conditions: { all: [low], any: [knock] } }, /"any" alone/, /nest one in the other/],
  ['"not" fires on unanswered checks', { ...plain, conditions: { all: [{ not: { all: [low] } }] } }, /nobody has answered/, /notEqual or notIn/],
  ['a named condition', { ...plain, conditions: { all: [{ condition: 'hot' }] } }, /can’t be followed/, /write the conditions out/],
  ['"path" evaluates an expression', { ...plain, conditions: { all: [{ ...knock, path: '$.a' }] } }, /run as an expression/, /leave it out/],
  ['text that begins as a number', { ...plain, conditions: { all: [{ ...low, value: '12abc' }] } }, /not a number/, /band edges as a number in SI: 100, 200/],
  ['a number as text', { ...plain, conditions: { all: [{ ...low, value: '100' }] } }, /not a number/, /as a number in SI/],
  ['texts compared by size', { ...plain, conditions: { all: [{ fact: 'noise', operator: 'lessThan', value: 'knock' }] } }, /can’t be asked/, /equal, notEqual, in or notIn/],
  ['an operator that nobody knows', { ...plain, conditions: { all: [{ ...knock, operator: 'equals' }] } }, /can’t be asked/, /equal, notEqual, in or notIn/],
  ['a check that nobody knows', { ...plain, conditions: { all: [{ ...knock, fact: 'nose' }] } }, /no check "nose"/, /id of a check/],
  ['an answer that nobody knows', { ...plain, conditions: { all: [{ ...knock, value: 'bang' }] } }, /no answer "bang"/, /"knock" or "none"/],
  ['a threshold that cuts a band', { ...plain, conditions: { all: [{ ...low, value: 150 }] } }, /not an edge/, /100, 200/],
  ['a key that nobody knows', { ...plain, conditions: { all: [{ ...knock, weight: 2 }] } }, /unknown key "weight"/, /fact, operator, value/],
  ['an event of type "success"', { ...plain, event: { type: 'success' } }, /unknown key "event"/, /event type is fixed/],
  ['an event of type "error"', { ...plain, event: { type: 'error' } }, /unknown key "event"/, /event type is fixed/],
  ['a priority of 0, which becomes 1', { ...plain, priority: 0 }, /unknown key "priority"/, /turn 0 into 1/],
  ['a name that is taken', { ...plain, name: 'knock' }, /./, /give each its own/],
];

describe('a rule on its way in', () => {
  it.each(TRAPS)('is refused: %s', (_, json, message, instead) => {
    const read = readRule(json, sound);
    const problems = read.ok ? [] : read.problems;
    expect(problems.map((problem) => problem.message).join('\n')).toMatch(message);
    expect(problems.map((problem) => problem.instead).join('\n')).toMatch(instead);
    expect(problems.every(({ path }) => !path.startsWith('rules['))).toBe(true);
  });

  it('is let in when it is sound, new or in place of another', () => {
    expect(readRule(plain, sound)).toEqual({ ok: true, rule: plain });
    expect(readRule({ ...plain, name: 'knock' }, sound, 0)).toMatchObject({ ok: true });
    expect(sound.rules).toHaveLength(1);
  });
});
