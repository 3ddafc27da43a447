import { describe, expect, it } from 'vitest';
import { compileRulebook } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { RECORD_FACTS } from '@/lib/diagnose/default-rulebook/record-facts';
import { parseRulebook } from '@/lib/diagnose/schema';
import { STATION_IDS } from '@/lib/diagnose/stations';
import { SOMETHING_ELSE, type Condition, type FactCondition, type RootCondition, type SetUp } from '@/lib/diagnose/types';

const { causes, checks, panels, evidenceGroups, rules, remedies, cautions } = defaultRulebook;

const ids = (things: { id: string }[]) => new Set(things.map(({ id }) => id));
const [causeIds, checkIds, cautionIds, groupIds] = [ids(causes), ids(checks), ids(cautions), ids(evidenceGroups)];

const leaves = (condition: RootCondition | Condition): FactCondition[] => {
  if ('fact' in condition) return [condition];
  return ('all' in condition ? condition.all : condition.any).flatMap(leaves);
};

/** Every text of the rulebook with the path where it stands. */
function texts(value: unknown, path = ''): [string, string][] {
  if (typeof value === 'string') return [[path, value]];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => texts(inner, `${path}/${key}`));
}
const allTexts = texts(defaultRulebook);

describe('the assembled default rulebook', () => {
  it('passes the strict schema unchanged', () => {
    expect(parseRulebook(structuredClone(defaultRulebook))).toEqual({ ok: true, rulebook: defaultRulebook });
  });

  it('compiles: every table is coherent', () => {
    expect(() => compileRulebook(defaultRulebook)).not.toThrow();
  });

  it('is plain JSON', () => {
    expect(JSON.parse(JSON.stringify(defaultRulebook))).toEqual(defaultRulebook);
  });

  it('uses every id once', () => {
    for (const things of [causes, checks, panels, evidenceGroups, remedies, cautions]) expect(ids(things).size).toBe(things.length);
    expect(new Set(rules.map(({ name }) => name)).size).toBe(rules.length);
  });
});

describe('references between its parts', () => {
  it('of checks: spoiled checks, cautions, record facts', () => {
    const factNames = new Set<string>(RECORD_FACTS.map(({ name }) => name));
    for (const check of checks) {
      for (const spoiled of check.spoils) {
        expect(checkIds, check.id).toContain(spoiled);
        expect(spoiled, check.id).not.toBe(check.id);
      }
      for (const caution of check.cautions) expect(cautionIds, check.id).toContain(caution);
      if (check.fromRecord) expect(factNames, check.id).toContain(check.fromRecord.fact);
    }
  });

  it('of record facts: every text that a check maps can be in the record, and leads to an answer', () => {
    for (const { id, fromRecord, states } of checks) {
      if (!fromRecord?.states) continue;
      const holds: readonly string[] | string = RECORD_FACTS.find(({ name }) => name === fromRecord.fact)?.holds ?? [];
      for (const [text, state] of Object.entries(fromRecord.states)) {
        expect(holds, id).toContain(text);
        expect(ids(states), id).toContain(state);
      }
    }
  });

  it('of rules: checks, answers, causes, groups', () => {
    for (const { name, conditions, weights, group } of rules) {
      for (const { fact, value } of leaves(conditions)) {
        expect(checkIds, name).toContain(fact);
        const states = ids(checks.find(({ id }) => id === fact)!.states);
        for (const state of [value].flat()) if (typeof state === 'string') expect(states, name).toContain(state);
      }
      for (const cause of Object.keys(weights)) {
        expect(causeIds, name).toContain(cause);
        expect(cause, name).not.toBe(SOMETHING_ELSE);
      }
      if (group !== undefined) expect(groupIds, name).toContain(group);
    }
  });

  it('of panels and remedies', () => {
    for (const { id, checks: inPanel } of panels) for (const check of inPanel) expect(checkIds, id).toContain(check);
    for (const { id, causes: removed, cautions: named } of remedies) {
      for (const cause of removed) expect(causeIds, id).toContain(cause);
      for (const caution of named) expect(cautionIds, id).toContain(caution);
    }
  });

  it('leave nothing over: every caution, group, cause and check is used', () => {
    const used = new Set([...checks, ...remedies].flatMap((thing) => thing.cautions));
    expect([...cautionIds].filter((id) => !used.has(id))).toEqual([]);
    expect([...groupIds].filter((id) => !rules.some(({ group }) => group === id))).toEqual([]);
    const weighed = new Set(rules.flatMap(({ weights }) => Object.keys(weights)));
    expect([...causeIds].filter((id) => id !== SOMETHING_ELSE && !weighed.has(id))).toEqual([]);
    const tested = new Set(rules.flatMap(({ conditions }) => leaves(conditions).map(({ fact }) => fact)));
    // What is measured for a release alone says nothing of the cause.
    const proving = new Set([...(defaultRulebook.proof?.release.checks ?? []), ...(defaultRulebook.proof?.release.oilDownstream.checks ?? [])].map(({ check }) => check));
    expect([...checkIds].filter((id) => !tested.has(id) && !proving.has(id))).toEqual([]);
  });

  it('cover every station with checks', () => {
    expect(STATION_IDS.filter((station) => !checks.some((check) => check.station === station))).toEqual([]);
  });
});

/** Cautions that a set-up asks for; each check that has it must carry all of them, or one of those in a nested list. */
const ASKED: [string, (setUp: SetUp, minutes: number) => boolean, (string | string[])[]][] = [
  ['engine running', ({ engine }) => engine === 'idle' || engine === 'governed', [['exhaust-fumes', 'belts-fan-gears', 'vehicle-rolls', 'road-test']]],
  ['governed speed', ({ engine }) => engine === 'governed', [['exhaust-fumes', 'road-test']]],
  ['a long run at idle', ({ engine }, minutes) => engine === 'idle' && minutes >= 10, ['exhaust-fumes']],
  ['brakes released', ({ brakes }) => brakes === 'released', ['vehicle-rolls']],
  ['air let out', ({ air }) => air === 'empty', ['stored-air', 'pressure-falls-suspension-brakes', 'vehicle-rolls']],
  ['line open', ({ access }) => access?.includes('line-open') ?? false, ['stored-air', 'hot-parts']],
  ['head off', ({ access }) => access?.includes('head-off') ?? false, ['stored-air', 'scalding-coolant']],
  ['compressor off', ({ access }) => access?.includes('compressor-off') ?? false, ['stored-air', 'scalding-coolant', 'heavy-part']],
];

describe('cautions of checks follow from their set-up', () => {
  it.each(ASKED)('%s', (_, applies, asked) => {
    for (const { id, setUp, minutes, cautions: named } of checks)
      if (applies(setUp, minutes))
        for (const one of asked) expect([one].flat().some((caution) => named.includes(caution)), `${id}: ${String(one)}`).toBe(true);
  });
});

describe('texts', () => {
  it('are never empty and have no stray spaces', () => {
    for (const [path, text] of allTexts) {
      expect(text, path).not.toBe('');
      expect(text, path).toBe(text.trim());
      expect(text, path).not.toMatch(/ {2}/);
    }
  });

  it('tell each check’s reason and steps', () => {
    for (const { id, prompt, why, steps } of checks) {
      expect(prompt.length, id).toBeLessThanOrEqual(160);
      expect(why, id).not.toBe('');
      expect(steps.length, id).toBeGreaterThan(0);
    }
  });

  it('call a regulation by its paragraph', () => {
    for (const thing of [...causes, ...checks, ...rules, ...remedies])
      if (thing.basis === 'regulation') expect(thing.source).toMatch(/49 CFR \d+\.\d+/);
  });

  /** No limit for discharge temperature was found for vehicle compressors: none may be stated as law. */
  it('state no discharge temperature as a limit of law', () => {
    for (const [path, text] of allTexts) {
      const aboutHeat = /(discharge|head|line|fitting)[^.]*temperature|temperature[^.]*(discharge|head|line|fitting)|°\s?[CF]\b/i.test(text);
      if (aboutHeat) expect(text, path).not.toMatch(/\bCFR\b|\blaw\b|\blegal|regulation|must not exceed|\blimit (is|of)\b|\bmaximum (is|of)\b/i);
    }
    for (const check of checks) if (check.quantity === 'temperature') expect(check.basis, check.id).not.toBe('regulation');
  });

  /** They come from the commercial driver manual. */
  it('do not credit the federal regulation with 45 s or with psi per minute', () => {
    for (const { basis, source, ...thing } of [...checks, ...rules, ...remedies, ...causes]) {
      const claims = texts({ ...thing, source }).flatMap(([, text]) => text.split(/[;:] |\. /));
      for (const claim of claims)
        if (/\b45 ?s(econds)?\b|psi(\/| per |\/ )min/i.test(claim)) expect(claim).not.toMatch(/\bCFR\b|federal/i);
      if (claims.some((claim) => /psi(\/| per )min/i.test(claim))) expect(basis).not.toBe('regulation');
    }
  });

  it('do not claim that the rule for shop air receivers governs vehicle tanks', () => {
    for (const [path, text] of allTexts) expect(text, path).not.toMatch(/1910\.169|OSHA/);
  });
});

describe('settings', () => {
  const { settings } = defaultRulebook;

  it('weigh evidence as the method’s defaults say', () => {
    expect(settings).toMatchObject({ beta: 1, defaultRho: 0.5, defaultReliability: 0.8 });
  });

  it('put a cold engine and a dismounted compressor among the dearest set-ups', () => {
    const { heat, access } = settings.setUpMinutes;
    expect(heat.cold).toBeGreaterThan(heat.hot);
    expect(Math.max(...Object.values(access))).toBe(access['compressor-off']);
  });
});
