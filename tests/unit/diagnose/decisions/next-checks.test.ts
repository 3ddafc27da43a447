import { describe, expect, it } from 'vitest';
import { compileRulebook, createWhatIf, type Check, type Finding, type Remedy, type Rulebook } from '@/lib/diagnose';
import { nextChecks, type NextChecksOptions } from '@/lib/diagnose/next-checks';
import { openChecks } from '@/lib/diagnose/next-checks-open';
import { book, cause, choice, finding, rule, somethingElse } from '../../../support/rulebook-parts';

const TELLING = 6;

/** Two causes; each check named has a rule of so many decibans for the first. */
function small(checks: Record<string, [decibans: number, more?: Partial<Check>]>, more: Partial<Rulebook> = {}): Rulebook {
  return book({
    causes: [cause('leak', 0.45), cause('worn', 0.45), somethingElse(0.1)],
    checks: Object.entries(checks).map(([id, [, fields]]) => choice(id, { yes: 0.2, no: 0.8 }, fields)),
    rules: Object.entries(checks).map(([id, [decibans]]) => rule(`${id} is yes`, { [id]: 'yes' }, { leak: decibans, worn: -decibans })),
    remedies: [remedy('cure', 'leak'), remedy('renew', 'worn')],
    ...more,
  });
}
const remedy = (id: string, removes: string): Remedy => ({
  id, station: null, name: id, causes: [removes], look: { minutes: 60 }, fix: { minutes: 120 }, parts: [],
  seenInBay: true, steps: [], cautions: [], basis: 'judgement',
});
function next(rulebook: Rulebook, findings: Finding[] = [], options: NextChecksOptions = {}) {
  const compiled = compileRulebook(rulebook);
  return nextChecks(openChecks(createWhatIf(compiled, findings), findings), options);
}
const ids = (result: ReturnType<typeof next>) => result.suggestions.map(({ checkIds }) => checkIds.join('+'));

describe('the check that tells most', () => {
  it('is the one that tells more in the same time', () => {
    expect(ids(next(small({ weak: [2], strong: [TELLING] })))).toEqual(['strong', 'weak']);
  });

  it('is the quicker one of two that tell the same', () => {
    expect(ids(next(small({ slow: [TELLING, { minutes: 30 }], quick: [TELLING, { minutes: 3 }] })))).toEqual(['quick', 'slow']);
  });

  it('is not one that can seldom be answered', () => {
    expect(ids(next(small({ dark: [TELLING, { cannotTell: 0.6 }], plain: [TELLING] })))).toEqual(['plain', 'dark']);
  });

  it('counts a quarter of a minute for one that takes none', () => {
    const [first] = next(small({ asked: [TELLING, { minutes: 0 }] })).suggestions;
    expect(first?.bitsPerMinute).toBeCloseTo((first?.bits ?? NaN) / 0.25, 12);
    expect(first?.cost).toBeCloseTo(0.25 * 2, 12);
  });

  it('counts the set-up from where the vehicle stands', () => {
    const book2 = small({ revved: [TELLING, { setUp: { engine: 'governed', air: 'full' } }], still: [TELLING, { minutes: 8 }] });
    expect(ids(next(book2))).toEqual(['still', 'revved']);
    const running = next(book2, [], { vehicle: { engine: 'governed', air: 'full', access: [] } });
    expect(ids(running)).toEqual(['revved', 'still']);
    expect(running.suggestions[0]).toMatchObject({ minutes: 5, setUpMinutes: 0 });
  });

  it('is never one that has been answered, or set aside', () => {
    const checks = small({ answered: [TELLING], skipped: [TELLING], open: [1] });
    expect(ids(next(checks, [finding('answered', 'no'), finding('skipped', {})]))).toEqual(['open']);
  });

  it('may be two at once, where a compound rule makes them tell more together', () => {
    const pair = small({ one: [0.5], other: [0.5] });
    pair.rules.push(rule('both', { one: 'yes', other: 'yes' }, { leak: 10, worn: -10 }));
    const [first, ...rest] = next(pair).suggestions;
    expect(first?.checkIds).toEqual(['one', 'other']);
    expect(first?.minutes).toBe(10);
    expect(rest.map(({ checkIds }) => checkIds)).toEqual([['one'], ['other']]);
    expect(first?.bits).toBeGreaterThan((rest[0]?.bits ?? NaN) + (rest[1]?.bits ?? NaN));
  });

  it('makes the one of two first that the other would spoil', () => {
    const pair = small({ one: [0.5, { spoils: ['other'] }], other: [0.5] });
    pair.rules.push(rule('both', { one: 'yes', other: 'yes' }, { leak: 10, worn: -10 }));
    expect(ids(next(pair))).toContain('other+one');
  });

  it('offers a panel once, through its best check', () => {
    const checks: Parameters<typeof small>[0] = { low: [2], high: [TELLING], alone: [3] };
    const panels = [{ id: 'where', station: 'dryer' as const, title: 'Where', prompt: 'Where is it?', checks: ['low', 'high'] }];
    const result = next(small(checks, { panels }));
    expect(ids(result)).toEqual(['high', 'alone']);
    expect(result.suggestions.map(({ panelId }) => panelId)).toEqual(['where', undefined]);
  });
});

describe('checks that spoil others', () => {
  it('wait for the valuable ones, and say which', () => {
    const result = next(small({ drain: [TELLING, { minutes: 1, spoils: ['catch'] }], catch: [TELLING, { minutes: 60 }] }));
    expect(ids(result)).toEqual(['catch', 'drain']);
    expect(result.suggestions[1]?.why).toEqual({ kind: 'waits-for', checkIds: ['catch'] });
    expect(result.suggestions[0]?.why).toEqual({ kind: 'chosen' });
  });

  it('do not wait for one that tells nothing', () => {
    const result = next(small({ drain: [TELLING, { minutes: 1, spoils: ['idle-look'] }], 'idle-look': [0.001, { minutes: 60 }] }));
    expect(ids(result)).toEqual(['drain', 'idle-look']);
    expect(result.suggestions[0]).toMatchObject({ why: { kind: 'chosen' }, spoils: ['idle-look'] });
  });

  it('in a ring go by worth', () => {
    const result = next(small({
      a: [TELLING, { minutes: 1, spoils: ['b'] }], b: [TELLING, { minutes: 2, spoils: ['c'] }], c: [TELLING, { minutes: 3, spoils: ['a'] }],
    }));
    expect(ids(result)).toEqual(['a', 'c', 'b']);
    expect(result.suggestions.map(({ why }) => why.kind)).toEqual(['chosen', 'waits-for', 'waits-for']);
  });

  it('leave out what they have spoiled, and say so', () => {
    const result = next(small({ drain: [1, { spoils: ['catch'] }], catch: [TELLING] }), [finding('drain', 'no')]);
    expect(ids(result)).toEqual([]);
    expect(result.spoiled).toEqual([{ checkId: 'catch', by: 'drain' }]);
  });

  it('have spoiled nothing when they were only set aside', () => {
    const result = next(small({ drain: [1, { spoils: ['catch'] }], catch: [TELLING] }), [finding('drain', {})]);
    expect(ids(result)).toEqual(['catch']);
    expect(result.spoiled).toEqual([]);
  });
});

describe('when to stop', () => {
  it('is not while a check saves more than its minutes cost', () => {
    const result = next(small({ look: [TELLING, { minutes: 5 }] }));
    expect(result.suggestions[0]?.saving).toBeGreaterThan(result.suggestions[0]?.cost ?? Infinity);
    expect(result.enoughIsKnown).toBe(false);
  });

  it('is when no check does; it is still listed', () => {
    const result = next(small({ look: [TELLING, { minutes: 500 }] }));
    expect(result.enoughIsKnown).toBe(true);
    expect(ids(result)).toEqual(['look']);
  });

  it('is when no answer would change the repair, however much a check tells', () => {
    const oneRemedy = small({ look: [3, { minutes: 0 }] }, { remedies: [remedy('cure', 'leak'), { ...remedy('renew', 'worn'), look: { minutes: 5 } }] });
    const result = next(oneRemedy);
    expect(result.suggestions[0]?.bits).toBeGreaterThan(0.05);
    expect(result.suggestions[0]?.saving).toBe(0);
    expect(result.enoughIsKnown).toBe(true);
  });

  it('comes sooner where labour is dear', () => {
    const look = small({ look: [TELLING, { minutes: 15 }] });
    expect(next(look, [], { money: { labourRatePerHour: 60 } }).enoughIsKnown).toBe(false);
    expect(next(look, [], { money: { labourRatePerHour: 60, serviceCost: 0 } }).enoughIsKnown).toBe(true);
  });

  it('is when nothing is left to ask', () => {
    expect(next(small({ look: [1] }), [finding('look', 'yes')]).enoughIsKnown).toBe(true);
  });
});
