import { describe, expect, it } from 'vitest';
import { compileRulebook, parseRulebook, RulebookError, type Problem, type Rule, type Rulebook } from '@/lib/diagnose';
import { LIMITS } from '@/lib/diagnose/schema-limits';
import { book, cause, choice, measured, rule, somethingElse } from '@/tests/support/rulebook-parts';

/** A rulebook with one of everything, as loose JSON, so that a test can spoil any place in it. */
function sound(): Rulebook {
  return book({
    causes: [somethingElse(0.2), cause('worn', 0.3), cause('choked', 0.5)],
    checks: [
      choice('noise', { knock: 0.2, rattle: 0.3, none: 0.5 }, { cautions: ['hot'], spoils: ['pressure'] }),
      choice('oil', { yes: 0.4, no: 0.6 }, { fromRecord: { fact: 'oilSeen', states: { Y: 'yes' } } }),
      measured('pressure', [100, 200], [0.3, 0.4, 0.3], { range: { min: 0, max: 1000 } }),
    ],
    panels: [{ id: 'look', station: 'dryer', title: 'Look', prompt: 'Look.', checks: ['oil'] }],
    evidenceGroups: [{ id: 'heat', name: 'Heat' }],
    rules: [
      rule('knock', { noise: 'knock' }, { worn: 6 }),
      { ...rule('low', {}, { choked: 3 }), conditions: { all: [{ fact: 'pressure', operator: 'lessThan', value: 100 }] }, group: 'heat' },
      rule('knock and oil', { noise: 'knock', oil: 'yes' }, { worn: 4 }),
    ],
    remedies: [
      {
        id: 'mend', station: 'dryer', name: 'Mend', causes: ['worn'], look: { minutes: 5 }, fix: { minutes: 5 }, parts: [],
        seenInBay: true, steps: [], cautions: ['hot'], basis: 'judgement',
      },
    ],
    cautions: [{ id: 'hot', text: 'It is hot.', worseWhen: [] }],
    priorVariants: [{ name: 'Young', when: { milesSinceFit: { below: 1000 } }, priors: { worn: 0.1 } }],
    proof: {
      fitting: { cautions: ['hot'] },
      breakIn: { cautions: ['hot'], engineRpm: 1000, pressure: { aim: 5.5e5, low: 5e5, high: 6e5 }, duration: { least: 1200, most: 1800 }, basis: 'judgement' },
      release: { checks: [{ check: 'noise', inOrder: ['none'] }], oilDownstream: { when: [{ check: 'oil', states: ['yes'] }], checks: [{ check: 'oil', inOrder: ['no'] }] } },
      watch: {
        begin: ['The tanks are clean.'],
        plans: [
          { id: 'all', name: 'Oil', causes: [], readings: [{ check: 'oil', inOrder: ['no'], every: 604_800 }], duration: 2_419_200, basis: 'judgement' },
          { id: 'wear', name: 'Noise', causes: ['worn'], readings: [{ check: 'noise', inOrder: ['none'], every: 604_800 }], duration: 2_419_200, basis: 'judgement' },
        ],
      },
    },
  });
}

function problemsWith(spoil: (json: Rulebook) => unknown): Problem[] {
  const json = sound();
  spoil(json);
  const parsed = parseRulebook(json);
  return parsed.ok ? [] : parsed.problems;
}

/** Spoils the conditions of the first rule with something the types would not let through. */
const withConditions = (conditions: unknown) =>
  problemsWith((json) => {
    (json.rules[0] as { conditions: unknown }).conditions = conditions;
  });
const noise = { fact: 'noise', operator: 'equal', value: 'knock' };
const pressure = (operator: string, value: unknown) => ({ all: [{ fact: 'pressure', operator, value }] });

describe('a rulebook', () => {
  it('passes when it is sound, as a copy', () => {
    const json = sound();
    const parsed = parseRulebook(json);
    expect(parsed).toEqual({ ok: true, rulebook: json });
    if (parsed.ok) expect(parsed.rulebook.rules[0]?.conditions).not.toBe(json.rules[0]?.conditions);
  });

  it('is refused by compileRulebook with every problem', () => {
    const json = sound();
    json.rules[0] = { ...rule('knock', { noise: 'thud' }, { worn: 6 }) };
    expect(() => compileRulebook(json)).toThrow(RulebookError);
    expect(() => compileRulebook(json)).toThrow(/rule "knock", rules\[0\]\.conditions\.all\[0\]\.value: "noise" has no answer "thud"\. Instead: write "knock" or "rattle" or "none"/);
  });
});

describe('each trap of json-rules-engine names the rule, the place and what to write instead', () => {
  it.each<[string, unknown, string, RegExp, RegExp]>([
    ['empty all', { all: [] }, 'all', /always hold/, /at least one/],
    ['empty any', { any: [] }, 'any', /always hold/, /at least one/],
    ['empty any, nested', { all: [noise, { any: [] }] }, 'all[1].any', /always hold/, /at least one/],
    ['any beside all', { all: [noise], any: [noise] }, '', /"any" alone/, /nest one in the other/],
    ['any beside all, nested', { all: [{ all: [noise], any: [noise] }] }, 'all[0]', /"any" alone/, /nest/],
    ['not', { not: noise }, 'not', /nobody has answered/, /notEqual or notIn/],
    ['not, nested', { all: [{ not: noise }] }, 'all[0].not', /nobody has answered/, /notEqual/],
    ['named condition', { condition: 'hot engine' }, 'condition', /named condition/, /write the conditions out/],
    ['named condition, nested', { all: [{ condition: 'hot engine' }] }, 'all[0].condition', /named condition/, /write/],
    ['path', { all: [{ ...noise, path: '$.x' }] }, 'all[0].path', /expression/, /leave it out/],
    ['params', { all: [{ ...noise, params: {} }] }, 'all[0].params', /params/, /leave it out/],
    ['priority of a condition', { all: [{ ...noise, priority: 0 }] }, 'all[0].priority', /no order/, /leave/],
    ['priority of a list', { all: [noise], priority: 2 }, 'priority', /no order/, /leave/],
    ['unknown key', { all: [{ ...noise, vlaue: 1 }] }, 'all[0].vlaue', /unknown key/, /fact, operator, value/],
    ['no root', noise, '', /neither "all" nor "any"/, /around it/],
    ['no object', 'knock', '', /not a condition/, /"all"/],
    ['no list', { all: noise }, 'all', /not a list/, /list of conditions/],
    ['list in a list', { all: [[noise]] }, 'all[0]', /not a condition/, /"all"/],
    ['unknown check', { all: [{ ...noise, fact: 'nose' }] }, 'all[0].fact', /no check "nose"/, /id of a check/],
    ['prototype as check', { all: [{ ...noise, fact: 'constructor' }] }, 'all[0].fact', /no check/, /id of a check/],
    ['unknown operator', { all: [{ ...noise, operator: 'contains' }] }, 'all[0].operator', /"contains"/, /equal, notEqual, in or notIn/],
    ['decorated operator', { all: [{ ...noise, operator: 'not:equal' }] }, 'all[0].operator', /not:equal/, /equal/],
    ['unknown answer', { all: [{ ...noise, value: 'thud' }] }, 'all[0].value', /no answer "thud"/, /"knock" or "rattle" or "none"/],
    ['fact as value', { all: [{ ...noise, value: { fact: 'oil' } }] }, 'all[0].value', /no answer/, /"knock"/],
    ['empty in', { all: [{ ...noise, operator: 'in', value: [] }] }, 'all[0].value', /list/, /list of/],
    ['text for in', { all: [{ ...noise, operator: 'in', value: 'knock' }] }, 'all[0].value', /list/, /list of/],
    ['unknown answer in a list', { all: [{ ...noise, operator: 'notIn', value: ['knock', 'thud'] }] }, 'all[0].value[1]', /"thud"/, /"knock"/],
    ['answer twice', { all: [{ ...noise, operator: 'in', value: ['knock', 'knock'] }] }, 'all[0].value', /twice/, /once/],
    ['lessThanInclusive', pressure('lessThanInclusive', 100), 'all[0].operator', /cut a band/, /write lessThan$/],
    ['greaterThan', pressure('greaterThan', 100), 'all[0].operator', /cut a band/, /write greaterThanInclusive$/],
    ['equal on a measured check', pressure('equal', 100), 'all[0].operator', /measured/, /lessThan or greaterThanInclusive/],
    ['a band for a threshold', pressure('lessThan', 'band-1'), 'all[0].value', /is a band/, /100, 200/],
    ['number with a tail', pressure('lessThan', '12abc'), 'all[0].value', /not a number/, /100, 200/],
    ['number as text', pressure('lessThan', '100'), 'all[0].value', /not a number/, /100, 200/],
    ['threshold off the edges', pressure('lessThan', 150), 'all[0].value', /not an edge/, /100, 200/],
    ['too many conditions', { all: Array.from({ length: LIMITS.conditionsInARule + 1 }, () => noise) }, `all[${LIMITS.conditionsInARule - 1}]`, /more than/, /split/],
  ])('%s', (_name, conditions, place, message, instead) => {
    const problems = withConditions(conditions);
    const path = place === '' ? 'rules[0].conditions' : `rules[0].conditions.${place}`;
    const problem = problems.find((each) => each.path === path);
    expect(problem, JSON.stringify(problems)).toMatchObject({ rule: 'knock' });
    expect(problem?.message).toMatch(message);
    expect(problem?.instead).toMatch(instead);
  });

  it('nesting without end', () => {
    let deep: unknown = noise;
    for (let depth = 0; depth < LIMITS.conditionDepth + 1; depth += 1) deep = { all: [deep] };
    expect(withConditions(deep)[0]?.message).toMatch(/nested more than/);
  });
});

describe('a rule', () => {
  const withRule = (more: Record<string, unknown>) => problemsWith((json) => json.rules.splice(0, 1, { ...rule('knock', { noise: 'knock' }, { worn: 6 }), ...more } as Rule));

  it.each<[string, Record<string, unknown>, string, RegExp, RegExp]>([
    ['with an event', { event: { type: 'success' } }, 'event', /unknown key "event"/, /leave it out/],
    ['with a priority', { priority: 0 }, 'priority', /unknown key "priority"/, /no order/],
    ['with a key of its own', { wieght: 3 }, 'wieght', /unknown key/, /spelling/],
    ['with NaN', { weights: { worn: NaN } }, 'weights.worn', /not a number/, /finite/],
    ['with an endless weight', { weights: { worn: Infinity } }, 'weights.worn', /not a number/, /finite/],
    ['with a weight as text', { weights: { worn: '6' } }, 'weights.worn', /text "6" stands where a number/, /without quotation marks/],
    ['with no weights', { weights: {} }, 'weights', /empty/, /at least one/],
    ['with a weight for something else', { weights: { 'something-else': 3 } }, 'weights.something-else', /background rates/, /leave it out/],
    ['with a weight for an unknown cause', { weights: { wron: 3 } }, 'weights.wron', /no cause "wron"/, /id of a cause/],
    ['with a prototype for a cause', { weights: { constructor: 3 } }, 'weights.constructor', /reserved/, /another name/],
    ['in an unknown group', { group: 'noise' }, 'group', /no evidence group "noise"/, /id of an evidence group/],
    ['without a name', { name: '' }, 'name', /empty/, /some text/],
    ['without conditions', { conditions: undefined }, 'conditions', /missing/, /"all"/],
    ['without a note', { note: undefined }, 'note', /missing/, /a text/],
    ['on another basis', { basis: 'hearsay' }, 'basis', /"hearsay"/, /"judgement"/],
    ['that fires on every answer', { conditions: { all: [{ ...noise, operator: 'in', value: ['knock', 'rattle', 'none'] }] } }, 'conditions', /every answer/, /only the answers/],
    ['that no answer fires', { conditions: { all: [noise, { ...noise, value: 'none' }] } }, 'conditions', /no answer/, /against each other/],
  ])('%s', (_name, more, place, message, instead) => {
    const problem = withRule(more).find((each) => each.path === `rules[0].${place}`);
    expect(problem?.message, JSON.stringify(withRule(more))).toMatch(message);
    expect(problem?.instead).toMatch(instead);
    expect(problem?.rule).toBe(more.name === '' ? 'number 1' : 'knock');
  });

  it('of the same name as another', () => {
    expect(problemsWith((json) => json.rules.push(rule('low', { oil: 'yes' }, { worn: 1 })))).toEqual([
      expect.objectContaining({ rule: 'low', path: 'rules[3].name', message: expect.stringMatching(/stands there twice, first at rules\[1\]\.name/) }),
    ]);
  });

  it('in another group than its neighbour on the same check', () => {
    const [problem] = problemsWith((json) => json.rules.push(rule('rattle', { noise: 'rattle' }, { worn: 1 }, { group: 'heat' })));
    expect(problem).toMatchObject({ rule: 'rattle', path: 'rules[3].group', message: expect.stringMatching(/group "heat", but rule "knock".*no group/) });
  });

  it('that gives a cause a second weight for an answer', () => {
    const [problem] = problemsWith((json) => json.rules.push({ ...rule('noisy', {}, { worn: 1 }), conditions: { all: [{ fact: 'noise', operator: 'notEqual', value: 'none' }] } }));
    expect(problem).toMatchObject({ rule: 'noisy', path: 'rules[3].weights.worn', message: expect.stringMatching(/"knock" gives "worn" a weight for "knock" too/) });
  });

  it('over several checks that weighs more than 10 dB, or fires always or never', () => {
    expect(problemsWith((json) => (json.rules[2] = rule('knock and oil', { noise: 'knock', oil: 'yes' }, { worn: -10.5 })))).toEqual([
      expect.objectContaining({ rule: 'knock and oil', path: 'rules[2].weights.worn', instead: expect.stringMatching(/write -10/) }),
    ]);
    expect(problemsWith((json) => (json.rules[2] = rule('knock and oil', { noise: 'knock', oil: 'yes' }, { worn: -10 })))).toEqual([]);
    const either = { any: [{ fact: 'oil', operator: 'equal' as const, value: 'yes' }, { fact: 'oil', operator: 'equal' as const, value: 'no' }, noise as never] };
    expect(problemsWith((json) => (json.rules[2] = { ...rule('always', {}, { worn: 1 }), conditions: either }))[0]?.message).toMatch(/whatever its checks show/);
    const neither = { all: [{ fact: 'oil', operator: 'equal' as const, value: 'yes' }, { fact: 'oil', operator: 'equal' as const, value: 'no' }, noise as never] };
    expect(problemsWith((json) => (json.rules[2] = { ...rule('never', {}, { worn: 1 }), conditions: neither }))[0]?.message).toMatch(/no combination/);
  });

  it('whose name runs over two lines', () => {
    expect(withRule({ name: 'knock\nknock' })[0]?.path).toBe('rules[0].name');
  });
});

describe('a table that can’t be true', () => {
  it('names the rule, the cause and the largest weight allowed', () => {
    const [problem] = problemsWith((json) => (json.rules[0] = rule('knock', { noise: 'knock' }, { worn: 7 })));
    expect(problem).toMatchObject({ rule: 'knock', path: 'rules[0].weights.worn' });
    expect(problem?.message).toMatch(/"worn".*add up to 1\.002/);
    // 10 log10(1 / 0.2) = 6.9897: two decimals below it.
    expect(problem?.instead).toBe('the largest weight allowed here is 6.98 dB');
    expect(problemsWith((json) => (json.rules[0] = rule('knock', { noise: 'knock' }, { worn: 6.98 })))).toEqual([]);
  });

  it('counts what other rules on the check have taken', () => {
    const [problem] = problemsWith((json) => json.rules.push(rule('rattle', { noise: 'rattle' }, { worn: 3 })));
    // 0.2 * 10^0.6 = 0.7962 is taken by "knock", the larger of the two; "rattle" takes 0.5986.
    expect(problem).toMatchObject({ rule: 'knock', instead: 'the largest weight allowed here is 3.02 dB' });
  });

  it('asks for all to be lowered where one alone can’t mend it', () => {
    const [problem] = problemsWith((json) => {
      json.rules[0] = rule('knock', { noise: 'knock' }, { worn: 8 });
      json.rules.push(rule('rattle', { noise: 'rattle' }, { worn: 6 }));
    });
    // 0.2 * 10^0.8 + 0.3 * 10^0.6 = 2.456: 3.90 dB too much.
    expect(problem?.instead).toBe('lower the weights of "knock", "rattle" by more than 3.91 dB each');
  });

  it('that gives every answer must add up to one within a hundredth', () => {
    const all = (worn: number) => problemsWith((json) => {
      json.rules[0] = rule('knock', { noise: 'knock' }, { worn: 3 });
      json.rules.push(rule('rattle', { noise: 'rattle' }, { worn: 0 }), rule('none', { noise: 'none' }, { worn }));
    });
    // 1 - 0.2 * 10^0.3 - 0.3 = 0.30095 is left for a background of 0.5: -2.205 dB.
    expect(all(-2.2)).toEqual([]);
    const [problem] = all(-2.4);
    expect(problem?.message).toMatch(/every answer is given/);
    expect(problem?.instead).toMatch(/leave one answer out/);
    expect(problem?.path).toMatch(/weights\.worn/);
  });
});

describe('checks, causes and the rest', () => {
  it.each<[string, (json: Rulebook) => unknown, string, RegExp]>([
    ['priors that do not sum to one', (json) => (json.causes[1] = cause('worn', 0.31)), 'causes', /sum to 1\.01/],
    ['no cause for something else', (json) => (json.causes[0] = cause('other', 0.2)), 'causes', /something-else/],
    ['a prior of nothing', (json) => (json.causes[1] = cause('worn', 0)), 'causes[1].prior', /too low/],
    ['a cause twice', (json) => json.causes.push(cause('worn', 0.1)), 'causes[3].id', /twice/],
    ['an id that is a reserved word', (json) => (json.causes[1] = cause('constructor', 0.3)), 'causes[1].id', /reserved/],
    ['an id with capitals', (json) => (json.causes[1] = cause('Worn', 0.3)), 'causes[1].id', /not an id/],
    ['backgrounds that do not sum to one', (json) => (json.checks[1] = choice('oil', { yes: 0.4, no: 0.5 })), 'checks[1].states', /0\.9/],
    ['a background of nothing', (json) => (json.checks[1] = choice('oil', { yes: 0, no: 1 })), 'checks[1].states[0].background', /too low/],
    ['one answer alone', (json) => (json.checks[1] = choice('oil', { yes: 1 })), 'checks[1].states', /too few/],
    ['a check twice', (json) => json.checks.push(choice('oil', { yes: 0.5, no: 0.5 })), 'checks[3].id', /twice/],
    ['an answer twice', (json) => json.checks[1]?.states.push({ id: 'no', label: 'not', background: 0.1 }), 'checks[1].states[2].id', /twice/],
    ['a label twice', (json) => Object.assign(json.checks[1]?.states[1] ?? {}, { label: 'yes' }), 'checks[1].states[1].label', /twice/],
    ['a gap between bands', (json) => Object.assign(json.checks[2]?.states[1] ?? {}, { low: 110 }), 'checks[2].states[1].low', /gap above "band-0"/],
    ['bands that overlap', (json) => Object.assign(json.checks[2]?.states[1] ?? {}, { low: 90 }), 'checks[2].states[1].low', /overlaps "band-0"/],
    ['bands out of order', (json) => json.checks[2]?.states.reverse(), 'checks[2].states[0].low', /open below/],
    ['a band without an upper edge', (json) => delete json.checks[2]?.states[0]?.high, 'checks[2].states[0].high', /no upper edge/],
    ['a first band that begins somewhere', (json) => Object.assign(json.checks[2]?.states[0] ?? {}, { low: 0 }), 'checks[2].states[0].low', /open below/],
    ['a last band that ends somewhere', (json) => Object.assign(json.checks[2]?.states[2] ?? {}, { high: 900 }), 'checks[2].states[2].high', /open above/],
    ['a band out of the range', (json) => Object.assign(json.checks[2] ?? {}, { range: { min: 0, max: 150 } }), 'checks[2].range', /out of the range/],
    ['a measured check without a unit', (json) => delete json.checks[2]?.unit, 'checks[2].unit', /missing/],
    ['a choice with a unit', (json) => Object.assign(json.checks[1] ?? {}, { unit: 'kPa' }), 'checks[1].unit', /has no "unit"/],
    ['a choice with a band', (json) => Object.assign(json.checks[1]?.states[0] ?? {}, { low: 1 }), 'checks[1].states[0]', /no band/],
    ['a record text for an unknown answer', (json) => Object.assign(json.checks[1] ?? {}, { fromRecord: { fact: 'oilSeen', states: { Y: 'ja' } } }), 'checks[1].fromRecord.states.Y', /no answer "ja"/],
    ['an unknown check that is spoiled', (json) => json.checks[0]?.spoils.push('temperature'), 'checks[0].spoils[1]', /no check/],
    ['a check that spoils itself', (json) => json.checks[0]?.spoils.push('noise'), 'checks[0].spoils', /itself/],
    ['an unknown caution', (json) => json.checks[0]?.cautions.push('cold'), 'checks[0].cautions[1]', /no caution/],
    ['an unknown check in a panel', (json) => json.panels[0]?.checks.push('pressures'), 'panels[0].checks[1]', /no check/],
    ['a check in two panels', (json) => json.panels.push({ id: 'again', station: 'dryer', title: 'Again', prompt: 'Look.', checks: ['oil'] }), 'panels[1].checks[0]', /twice/],
    ['an unknown cause of a remedy', (json) => json.remedies[0]?.causes.push('wear'), 'remedies[0].causes[1]', /no cause/],
    ['an unknown caution of a remedy', (json) => json.remedies[0]?.cautions.push('wear'), 'remedies[0].cautions[1]', /no caution/],
    ['an unknown station', (json) => Object.assign(json.checks[0] ?? {}, { station: 'engine' }), 'checks[0].station', /"engine" is not known/],
    ['an unknown key in a set-up', (json) => Object.assign(json.checks[0]?.setUp ?? {}, { motor: 'off' }), 'checks[0].setUp.motor', /unknown key/],
    ['an unknown key at the root', (json) => Object.assign(json, { version: 2 }), 'version', /unknown key/],
    ['a beta that turns evidence round', (json) => (json.settings.beta = -1), 'settings.beta', /too low/],
    ['a beta beyond 1.5', (json) => (json.settings.beta = 2), 'settings.beta', /too high/],
    ['a rho beyond 1', (json) => (json.settings.defaultRho = 1.2), 'settings.defaultRho', /too high/],
    ['a reliability of nothing', (json) => (json.settings.defaultReliability = 0), 'settings.defaultReliability', /too low/],
    ['a check that can never be answered', (json) => Object.assign(json.checks[0] ?? {}, { cannotTell: 1 }), 'checks[0].cannotTell', /too high/],
    ['a variant that always holds', (json) => Object.assign(json.priorVariants?.[0] ?? {}, { when: {} }), 'priorVariants[0].when', /empty/],
    ['a variant that never holds', (json) => Object.assign(json.priorVariants?.[0] ?? {}, { when: { miles: { atLeast: 5, below: 5 } } }), 'priorVariants[0].when.miles', /nothing/],
    ['a variant that leaves nothing over', (json) => Object.assign(json.priorVariants?.[0] ?? {}, { priors: { worn: 0.6, choked: 0.4 } }), 'priorVariants[0].priors', /sum to 1/],
    ['a variant with an unknown cause', (json) => Object.assign(json.priorVariants?.[0] ?? {}, { priors: { wear: 0.6 } }), 'priorVariants[0].priors.wear', /no cause/],
    ['a band that does not hold its aim', (json) => Object.assign(json.proof?.breakIn.pressure ?? {}, { aim: 7e5 }), 'proof.breakIn.pressure', /not within its band/],
    ['a break-in that ends before it may', (json) => Object.assign(json.proof?.breakIn.duration ?? {}, { least: 3600 }), 'proof.breakIn.duration', /longer than the most/],
    ['an unknown check of the release', (json) => json.proof?.release.checks.push({ check: 'pressures', inOrder: ['none'] }), 'proof.release.checks[1].check', /no check/],
    ['an unknown answer that means oil downstream', (json) => json.proof?.release.oilDownstream.when[0]?.states.push('ja'), 'proof.release.oilDownstream.when[0].states[1]', /no answer "ja"/],
    ['an unknown cause of a watch', (json) => json.proof?.watch.plans[1]?.causes.push('wear'), 'proof.watch.plans[1].causes[1]', /no cause/],
    ['a cause that two plans watch', (json) => json.proof?.watch.plans[1]?.causes.push('worn'), 'proof.watch.plans[1].causes[1]', /by "wear" already/],
    ['an unknown caution of a fitting', (json) => json.proof?.fitting.cautions.push('cold'), 'proof.fitting.cautions[1]', /no caution/],
    ['a watch of an unknown answer', (json) => Object.assign(json.proof?.watch.plans[0]?.readings[0] ?? {}, { inOrder: ['ja'] }), 'proof.watch.plans[0].readings[0].inOrder[0]', /no answer "ja"/],
    ['no watch for the causes that none names', (json) => json.proof?.watch.plans.shift(), 'proof.watch.plans', /no plan/],
    ['another version of the shape', (json) => Object.assign(json, { schemaVersion: 2 }), 'schemaVersion', /2 is not known/],
  ])('refuses %s', (_name, spoil, path, message) => {
    const problems = problemsWith(spoil);
    const problem = problems.find((each) => each.path === path);
    expect(problem?.message, JSON.stringify(problems)).toMatch(message);
    expect(problem?.instead).toMatch(/\w/);
  });

  it('refuses the key __proto__ anywhere, which a schema library may drop without a word', () => {
    const text = JSON.stringify(sound()).replace('"worn":6', '"__proto__":6');
    const parsed = parseRulebook(JSON.parse(text));
    expect(parsed).toMatchObject({ ok: false, problems: [{ rule: 'knock', path: 'rules[0].weights.__proto__' }] });
  });

  it.each([null, undefined, 5, 'rulebook', [], () => 5])('refuses %s', (json) => {
    expect(parseRulebook(json).ok).toBe(false);
  });

  it('refuses what is too large or too deep', () => {
    let deep: unknown = 1;
    for (let i = 0; i < 5000; i += 1) deep = [deep];
    const circular: Record<string, unknown> = {};
    circular.self = circular;
    for (const json of [deep, circular, Array.from({ length: LIMITS.values + 1 }, () => 1), { title: 'x'.repeat(LIMITS.textLength + 1) }]) {
      const parsed = parseRulebook(json);
      expect(parsed.ok ? [] : parsed.problems).toHaveLength(1);
    }
  });
});
