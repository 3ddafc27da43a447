import { describe, expect, it, vi } from 'vitest';
import { attenuationFactors } from '@/lib/diagnose/attenuation';
import { compileRulebook, compileTrusted, parseRulebook, rank, SOMETHING_ELSE, type Finding, type Ranking, type Rulebook } from '@/lib/diagnose';
import { choice, finding, rule } from '@/tests/support/rulebook-parts';
import { seededRandom } from '@/tests/support/random';
import { forAllCases } from './for-all-cases';
import { referencePosterior } from './reference-ranker';

vi.setConfig({ testTimeout: 60_000 });

const pOf = (ranking: Ranking, causeId: string) => ranking.causes.find((cause) => cause.causeId === causeId)?.p ?? NaN;
const rankBook = (rulebook: Rulebook, findings: readonly Finding[]) => rank(compileTrusted(rulebook), findings);
const listed = (rulebook: Rulebook) => rulebook.causes.map(({ id }) => id).filter((id) => id !== SOMETHING_ELSE);

describe('the random rulebooks', () => {
  it('are such as the schema takes', () =>
    forAllCases(({ rulebook }) => expect(parseRulebook(rulebook)).toEqual({ ok: true, rulebook })));
});

describe('the ranking of any rulebook and findings', () => {
  it('is the model written out plainly', () =>
    forAllCases(({ rulebook, findings }) => {
      const ranking = rankBook(rulebook, findings);
      for (const [causeId, p] of referencePosterior(rulebook, findings)) expect(pOf(ranking, causeId)).toBeCloseTo(p, 10);
    }, { runs: 400 }));

  it('sums to one, over causes and over stations', () =>
    forAllCases(({ rulebook, findings }) => {
      const { causes, suspicion } = rankBook(rulebook, findings);
      expect(causes.reduce((sum, { p }) => sum + p, 0)).toBeCloseTo(1, 12);
      expect(Object.values(suspicion).reduce((sum, p) => sum + p, 0)).toBeCloseTo(1, 12);
    }));

  it('has its causes in order, highest first', () =>
    forAllCases(({ rulebook, findings }) => {
      const ps = rankBook(rulebook, findings).causes.map(({ p }) => p);
      expect(ps).toEqual([...ps].sort((a, b) => b - a));
    }));

  it('is the same to the last bit in whatever order rulebook and findings come', () =>
    forAllCases(({ rulebook, findings }, seed) => {
      const { shuffle } = seededRandom(seed);
      const shuffled: Rulebook = {
        ...rulebook,
        causes: shuffle(rulebook.causes),
        checks: shuffle(rulebook.checks).map((check) => (check.kind === 'choice' ? { ...check, states: shuffle(check.states) } : check)),
        rules: shuffle(rulebook.rules),
        evidenceGroups: shuffle(rulebook.evidenceGroups),
      };
      const reordered = shuffle(findings).map((each) => ({ ...each, shares: shuffle(each.shares) }));
      expect(rankBook(shuffled, reordered)).toEqual(rankBook(rulebook, findings));
    }));

  it('does not lower a cause when the weight of the answer that fired is raised', () =>
    forAllCases(({ rulebook, findings }, seed) => {
      const random = seededRandom(seed);
      const before = rankBook(rulebook, findings);
      const sure = new Set(findings.filter(({ shares }) => shares.length === 1).map(({ checkId }) => checkId));
      const fired = rulebook.rules.filter(
        ({ name, conditions }) => before.fired.includes(name) && (JSON.stringify(conditions).match(/check-\d+/g) ?? []).every((id) => sure.has(id)),
      );
      if (fired.length === 0) return;
      const { name, weights } = random.pick(fired);
      const causeId = random.pick(Object.keys(weights));
      const raised = {
        ...rulebook,
        rules: rulebook.rules.map((each) =>
          each.name === name ? { ...each, weights: { ...each.weights, [causeId]: (each.weights[causeId] ?? 0) + random.between(0, 2) } } : each,
        ),
      };
      if (!parseRulebook(raised).ok) return;
      expect(pOf(rankBook(raised, findings), causeId)).toBeGreaterThanOrEqual(pOf(before, causeId) - 1e-12);
    }, { runs: 400 }));

  it('does not lower a cause when there is evidence for it alone', () =>
    forAllCases(({ rulebook, findings }, seed) => {
      const random = seededRandom(seed);
      const causeId = random.pick(listed(rulebook));
      const group = random.pick([undefined, ...rulebook.evidenceGroups.map(({ id }) => id)]);
      const more = {
        ...rulebook,
        checks: [...rulebook.checks, choice('new-check', { yes: 0.1, no: 0.9 })],
        rules: [...rulebook.rules, rule('new rule', { 'new-check': 'yes' }, { [causeId]: random.between(0.1, 9) }, group === undefined ? {} : { group })],
      };
      const before = rankBook(more, findings);
      const after = rankBook(more, [...findings, finding('new-check', 'yes')]);
      expect(pOf(after, causeId)).toBeGreaterThanOrEqual(pOf(before, causeId) - 1e-12);
    }));

  it('is bit for bit the same for an unknown answer and for none', () =>
    forAllCases(({ rulebook, findings }) => {
      const known = findings.filter(({ shares }) => shares.length > 0);
      const unanswered = rulebook.checks.filter(({ id }) => !known.some(({ checkId }) => checkId === id)).map(({ id }) => finding(id, {}));
      expect(rankBook(rulebook, [...known, ...unanswered])).toEqual(rankBook(rulebook, known));
    }));

  it('adds up exactly: a score is its prior and its terms, in their order', () =>
    forAllCases(({ rulebook, findings }) => {
      for (const { scoreNats, prior, terms } of rankBook(rulebook, findings).causes) {
        expect(terms.reduce((sum, { countedNats }) => sum + countedNats, Math.log(prior))).toBe(scoreNats);
      }
    }));

  it('caps each group: the strongest weight each way counts whole, all together at most 1 / (1 - rho) of it', () =>
    forAllCases(({ rulebook, findings }) => {
      const { beta, defaultRho } = rulebook.settings;
      for (const { terms } of rankBook(rulebook, findings).causes) {
        for (const group of new Set(terms.map((term) => term.group))) {
          const rho = rulebook.evidenceGroups.find(({ id }) => id === group)?.rho ?? defaultRho;
          for (const sign of [1, -1]) {
            const side = terms.filter((term) => term.group === group && sign * term.weightNats > 0);
            const strongest = Math.max(0, ...side.map(({ weightNats }) => Math.abs(weightNats)));
            const counted = side.reduce((sum, { countedNats }) => sum + Math.abs(countedNats), 0);
            expect(counted).toBeGreaterThanOrEqual(beta * strongest * (1 - 1e-12));
            const most = rho === 1 ? side.length : (1 - rho ** side.length) / (1 - rho);
            expect(counted).toBeLessThanOrEqual(beta * strongest * most * (1 + 1e-12));
          }
        }
      }
    }));

  it('is naive Bayes at rho = 1', () =>
    forAllCases(({ rulebook, findings }) => {
      const flat = { ...rulebook, evidenceGroups: rulebook.evidenceGroups.map((group) => ({ ...group, rho: 1 })) };
      const { causes } = rankBook(flat, findings);
      const products = causes.map(({ prior, terms }) => terms.reduce((product, { weightNats }) => product * Math.exp(weightNats), prior));
      const total = products.reduce((sum, product) => sum + product, 0);
      causes.forEach(({ p }, index) => expect(p).toBeCloseTo((products[index] ?? 0) / total, 12));
    }, { shape: { rho: 1, beta: 1 } }));

  it('tempers evidence and not the prior', () =>
    forAllCases(({ rulebook, findings }) => {
      const half = { ...rulebook, settings: { ...rulebook.settings, beta: rulebook.settings.beta / 2 } };
      const whole = new Map(rankBook(rulebook, findings).causes.map((each) => [each.causeId, each]));
      for (const { causeId, scoreNats, prior } of rankBook(half, findings).causes) {
        const evidence = (whole.get(causeId)?.scoreNats ?? NaN) - Math.log(prior);
        expect(scoreNats - Math.log(prior)).toBeCloseTo(evidence / 2, 10);
      }
    }));

  it('is certain of something else when every listed cause is as good as ruled out', () =>
    forAllCases(({ rulebook, findings }) => {
      const against = {
        ...rulebook,
        checks: [...rulebook.checks, choice('last', { yes: 0.5, no: 0.5 })],
        rules: [...rulebook.rules, rule('none of them', { last: 'yes' }, Object.fromEntries(listed(rulebook).map((id) => [id, -2000])))],
      };
      const { causes, fit } = rankBook(against, [...findings, finding('last', 'yes')]);
      expect(causes[0]?.causeId).toBe(SOMETHING_ELSE);
      expect(causes[0]?.p).toBeCloseTo(1, 12);
      expect(fit).toEqual({ fits: false, reason: 'something-else-leads' });
    }));
});

describe('the completed table of any check', () => {
  it('makes the chances of the answers sum to one for every cause', () =>
    forAllCases(({ rulebook }) => {
      const compiled = compileRulebook(rulebook);
      for (const { backgrounds, table } of compiled.checks.values()) {
        compiled.causeIds.forEach((_, cause) => {
          const sum = backgrounds.reduce((total, background, state) => total + background * Math.exp(table[state]?.[cause] ?? NaN), 0);
          expect(sum).toBeCloseTo(1, 12);
        });
      }
    }));

  it('leaves something else at the background rates', () =>
    forAllCases(({ rulebook }) => {
      const compiled = compileRulebook(rulebook);
      const other = compiled.causeIndex.get(SOMETHING_ELSE) ?? NaN;
      for (const { table } of compiled.checks.values()) for (const state of table) expect(state[other]).toBe(0);
    }));
});

describe('weights of 2000 nats', () => {
  const causes = [0.5, 0.3, 0.2].map((prior, index) => ({ id: [SOMETHING_ELSE, 'a', 'b'][index] ?? '', prior }));

  it('do not overflow, for or against, sure, split or thought so', () => {
    const checks = ['one', 'two', 'three', 'four'].map((id) => choice(id, { rare: 1e-260, common: 0.4, other: 0.6 }));
    const rulebook = compileRulebook({
      ...emptyBook(),
      causes: causes.map(({ id, prior }) => ({ id, prior, station: null, name: id, sentence: 's', basis: 'judgement' })),
      checks,
      rules: checks.map(({ id }) => rule(id, { [id]: 'rare' }, { a: 2599, b: -8686 })),
    });
    for (const shares of [{ rare: 1 }, { rare: 0.5, common: 0.5 }] as Record<string, number>[]) {
      for (const reliability of [1, 0.8]) {
        const ranking = rank(rulebook, checks.map(({ id }) => finding(id, shares, { reliability })));
        expect(ranking.causes.every(({ p, scoreNats }) => Number.isFinite(p) && Number.isFinite(scoreNats))).toBe(true);
        expect(ranking.causes[0]?.scoreNats).toBeGreaterThan(2000);
        expect(ranking.causes.map(({ p }) => p)).toEqual([1, 0, 0]);
      }
    }
    const against = rank(rulebook, checks.map(({ id }) => finding(id, 'rare'))).causes.at(-1);
    expect(against?.causeId).toBe('b');
    expect(against?.scoreNats).toBeLessThan(-4 * 1999);
  });
});

describe('attenuation', () => {
  it('takes the strongest each way at rho = 0', () => {
    expect(attenuationFactors([1, 3, -2, -5], 0)).toEqual([0, 1, 0, 1]);
  });
  it('counts everything at rho = 1', () => {
    expect(attenuationFactors([1, 3, -2, -5], 1)).toEqual([1, 1, 1, 1]);
  });
  it('halves the second and quarters the third at rho = 0.5', () => {
    expect(attenuationFactors([1, 3, -2, 2], 0.5)).toEqual([0.25, 1, 1, 0.5]);
  });
  it('lets equal weights share the mean of their factors', () => {
    expect(attenuationFactors([2, 2, 4], 0.5)).toEqual([0.375, 0.375, 1]);
    expect(attenuationFactors([-2, 2, -2], 0)).toEqual([0.5, 1, 0.5]);
  });
});

function emptyBook(): Rulebook {
  return {
    schemaVersion: 1,
    title: 'Extremes',
    settings: {
      beta: 1, defaultRho: 1, defaultReliability: 0.8, labourRatePerHour: 1, serviceCost: 1, comebackCost: 1,
      setUpMinutes: {
        engine: { off: 1, idle: 1, governed: 1 }, air: { full: 1, empty: 1 }, heat: { hot: 1, cold: 1 }, brakes: { released: 1, applied: 1 },
        access: { 'wheels-chocked': 1, 'cab-tilted': 1, 'panels-off': 1, 'line-open': 1, 'head-off': 1, 'compressor-off': 1 },
      },
    },
    causes: [], checks: [], panels: [], evidenceGroups: [], rules: [], remedies: [], cautions: [],
  };
}
