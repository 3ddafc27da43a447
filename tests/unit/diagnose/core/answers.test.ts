import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { evidenceNats } from '@/lib/diagnose/contributions';
import { compileRulebook, FindingError, findingsFromRecord, overRecord, rank, sharesOf, type Answer, type CompiledCheck, type Stage } from '@/lib/diagnose';
import { book, cause, choice, finding, measured, rule, somethingElse } from '@/tests/support/rulebook-parts';

const compiled = compileRulebook(
  book({
    causes: [somethingElse(0.2), cause('worn', 0.3), cause('choked', 0.5)],
    checks: [
      choice('noise', { knock: 0.2, none: 0.8 }, { reliability: 0.6 }),
      choice('opening', { large: 0.7, small: 0.3 }, { fromRecord: { fact: 'drainOpening', states: { 'large-cavity': 'large', 'small-hole': 'small' } } }),
      choice('duty', { 'long-haul': 0.6, 'stop-start': 0.4 }, { fromRecord: { fact: 'vocation' } }),
      measured('age', [100, 200], [0.3, 0.4, 0.3], { range: { min: 0, max: 1000 }, fromRecord: { fact: 'age' } }),
    ],
    rules: [
      rule('knock', { noise: 'knock' }, { worn: 6 }),
      { ...rule('young', {}, { choked: 3 }), conditions: { all: [{ fact: 'age', operator: 'lessThan', value: 100 }] } },
      { ...rule('young and knocking', {}, { worn: 5 }), conditions: { all: [{ fact: 'age', operator: 'lessThan', value: 100 }, { fact: 'noise', operator: 'equal', value: 'knock' }] } },
    ],
  }),
);
const check = (id: string): CompiledCheck => {
  const found = compiled.checks.get(id);
  if (!found) throw new Error(`no check ${id}`);
  return found;
};
const read = (value: number, error = 0): Answer => ({ kind: 'measured', value, error, sureness: 'sure' });
const codeOf = (act: () => unknown): string | undefined => {
  try {
    act();
  } catch (error) {
    return error instanceof FindingError ? error.code : 'another error';
  }
  return undefined;
};

describe('shares of an answer', () => {
  it('put a value on an edge in the band above it: bands are half-open', () => {
    expect(sharesOf(check('age'), read(100)).shares).toEqual([{ state: 'band-1', share: 1 }]);
    expect(sharesOf(check('age'), read(99.999)).shares).toEqual([{ state: 'band-0', share: 1 }]);
    expect(sharesOf(check('age'), read(200)).shares).toEqual([{ state: 'band-2', share: 1 }]);
  });

  it('split a value by the part of its error that lies in each band', () => {
    expect(sharesOf(check('age'), read(95, 10)).shares).toEqual([
      { state: 'band-0', share: 0.75 },
      { state: 'band-1', share: 0.25 },
    ]);
    expect(sharesOf(check('age'), read(150, 100)).shares).toEqual([
      { state: 'band-0', share: 0.25 },
      { state: 'band-1', share: 0.5 },
      { state: 'band-2', share: 0.25 },
    ]);
    expect(sharesOf(check('age'), read(150, 50)).shares).toEqual([{ state: 'band-1', share: 1 }]);
  });

  it('sum to one for any value and error', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1000, noNaN: true }), fc.double({ min: 0, max: 500, noNaN: true }), (value, error) => {
        const { shares } = sharesOf(check('age'), read(value, error));
        expect(shares.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
        expect(shares.every(({ share }) => share > 0)).toBe(true);
      }),
      { seed: 1 },
    );
  });

  it('keep a value whole when its error is lost in rounding', () => {
    expect(sharesOf(check('age'), read(200, 1e-18)).shares).toEqual([{ state: 'band-2', share: 1 }]);
  });

  it('take the reliability of "think so" from the check, then from the rulebook', () => {
    expect(sharesOf(check('noise'), { kind: 'state', state: 'knock', sureness: 'think-so' }).reliability).toBe(0.6);
    expect(sharesOf(check('duty'), { kind: 'state', state: 'long-haul', sureness: 'think-so' }).reliability).toBe(0.8);
    expect(sharesOf(check('duty'), { kind: 'state', state: 'long-haul', sureness: 'sure' }).reliability).toBe(1);
  });

  it('are none for can’t tell and skip', () => {
    expect(sharesOf(check('age'), { kind: 'cannot-tell' }).shares).toEqual([]);
    expect(sharesOf(check('noise'), { kind: 'skip' }).shares).toEqual([]);
  });

  it('are refused for what can’t be', () => {
    expect(codeOf(() => sharesOf(check('age'), read(1000.1)))).toBe('out-of-range');
    expect(codeOf(() => sharesOf(check('age'), read(-1)))).toBe('out-of-range');
    expect(codeOf(() => sharesOf(check('age'), read(NaN)))).toBe('out-of-range');
    expect(codeOf(() => sharesOf(check('age'), read(5, -1)))).toBe('bad-error');
    expect(codeOf(() => sharesOf(check('age'), read(5, Infinity)))).toBe('bad-error');
    expect(codeOf(() => sharesOf(check('age'), { kind: 'state', state: 'band-0', sureness: 'sure' }))).toBe('wrong-kind');
    expect(codeOf(() => sharesOf(check('noise'), read(5)))).toBe('wrong-kind');
    expect(codeOf(() => sharesOf(check('noise'), { kind: 'state', state: 'rattle', sureness: 'sure' }))).toBe('unknown-state');
  });
});

describe('the weight of a finding', () => {
  it('is the table’s own, bit for bit, when it is one sure state', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, min: -2000, max: 2000 }), (nats) => {
        expect(evidenceNats([nats], [1], 1)).toBe(nats);
      }),
      { seed: 1 },
    );
  });
  it('is ln(r e^w + 1 - r) for think so', () => {
    expect(evidenceNats([Math.log(2)], [1], 0.8)).toBeCloseTo(Math.log(1.8), 14);
    expect(evidenceNats([-2000], [1], 0.8)).toBeCloseTo(Math.log(0.2), 14);
    expect(evidenceNats([2000], [1], 0.8)).toBeCloseTo(2000 + Math.log(0.8), 9);
  });
  it('is ln of the shared-out ratios for a split value', () => {
    expect(evidenceNats([Math.log(4), Math.log(0.5)], [0.25, 0.75], 1)).toBeCloseTo(Math.log(1.375), 14);
    expect(evidenceNats([Math.log(4), Math.log(0.5)], [0.25, 0.75], 0.5)).toBeCloseTo(Math.log(0.5 * 1.375 + 0.5), 14);
  });
  it('is exactly nothing where no answer tells anything', () => {
    expect(evidenceNats([0, 0, 0], [0.3, 0.3, 0.4], 0.8)).toBe(0);
  });
});

describe('compound rules', () => {
  const fired = (age: Record<string, number>) => rank(compiled, [finding('noise', 'knock'), finding('age', age)]).fired.includes('young and knocking');
  it('see the state with the largest share, and in a tie the lower band', () => {
    expect(fired({ 'band-0': 0.6, 'band-1': 0.4 })).toBe(true);
    expect(fired({ 'band-0': 0.4, 'band-1': 0.6 })).toBe(false);
    expect(fired({ 'band-0': 0.5, 'band-1': 0.5 })).toBe(true);
    expect(fired({ 'band-1': 0.5, 'band-0': 0.5 })).toBe(true);
  });
  it('are as sure as all their findings together', () => {
    const findings = [finding('noise', 'knock', { reliability: 0.8 }), finding('age', 'band-0', { reliability: 0.5 })];
    const worn = rank(compiled, findings).causes.find(({ causeId }) => causeId === 'worn');
    expect(worn?.terms.find(({ kind }) => kind === 'compound')?.weightNats).toBeCloseTo(Math.log(0.4 * 10 ** 0.5 + 0.6), 14);
  });
});

describe('stages', () => {
  const after: Stage = { kind: 'after-remedy', remedy: 1 };
  const both = [finding('noise', 'knock'), finding('noise', 'none', { id: 'later', stage: after })];

  it('are diagnosis alone unless asked for: a reading after a repair contradicts nothing', () => {
    expect(rank(compiled, both)).toEqual(rank(compiled, [finding('noise', 'knock')]));
    expect(rank(compiled, both).stages).toEqual([{ kind: 'diagnosis' }]);
  });
  it('can be others, and the ranking says which it used', () => {
    const ranking = rank(compiled, both, { stages: [after] });
    expect(ranking.stages).toEqual([after]);
    expect(ranking.fired).toEqual([]);
    const mixed = rank(compiled, [finding('duty', 'long-haul'), ...both], { stages: [after, { kind: 'watch' }, { kind: 'diagnosis' }].slice(0, 2) as Stage[] });
    expect(mixed.stages).toEqual([after]);
  });
  it('are not mixed on one check', () => {
    expect(codeOf(() => rank(compiled, both, { stages: [{ kind: 'diagnosis' }, after] }))).toBe('answered-twice');
    expect(codeOf(() => rank(compiled, [finding('noise', 'knock'), finding('noise', 'none', { id: 'b' })]))).toBe('answered-twice');
  });
});

describe('a finding that does not fit the rulebook', () => {
  it.each([
    ['unknown-check', finding('nothing', 'knock')],
    ['unknown-state', finding('noise', 'rattle')],
    ['bad-shares', finding('noise', { knock: 0.5, none: 0.4 })],
    ['bad-shares', finding('noise', { knock: 1.5, none: -0.5 })],
    ['bad-shares', finding('noise', { knock: NaN })],
    ['bad-reliability', finding('noise', 'knock', { reliability: 0 })],
    ['bad-reliability', finding('noise', 'knock', { reliability: 1.1 })],
    ['bad-reliability', finding('noise', 'knock', { reliability: NaN })],
  ])('is refused: %s', (code, bad) => {
    expect(codeOf(() => rank(compiled, [bad]))).toBe(code);
  });
  it('is refused when it names a state twice', () => {
    const bad = finding('noise', 'knock', { shares: [{ state: 'knock', share: 0.5 }, { state: 'knock', share: 0.5 }] });
    expect(codeOf(() => rank(compiled, [bad]))).toBe('bad-shares');
  });
});

describe('findings from the record', () => {
  it('answer a choice by the text, and a measured check by the number', () => {
    const found = findingsFromRecord(compiled, { drainOpening: 'small-hole', vocation: 'stop-start', age: 250 });
    expect(found.map(({ id, shares }) => [id, shares])).toEqual([
      ['record:age', [{ state: 'band-2', share: 1 }]],
      ['record:duty', [{ state: 'stop-start', share: 1 }]],
      ['record:opening', [{ state: 'small', share: 1 }]],
    ]);
    expect(found.every(({ reliability, stage }) => reliability === 1 && stage.kind === 'diagnosis')).toBe(true);
  });
  it('answer nothing from what is missing, unlisted, of the wrong kind or impossible', () => {
    expect(findingsFromRecord(compiled, {})).toEqual([]);
    expect(findingsFromRecord(compiled, { drainOpening: 'unknown', vocation: 'constructor', age: 'old' })).toEqual([]);
    expect(findingsFromRecord(compiled, { age: -5 })).toEqual([]);
  });
  it('give way to an answer, but not to "can’t tell" or to a reading after a repair', () => {
    const record = findingsFromRecord(compiled, { age: 250 });
    const answer = finding('age', 'band-0');
    expect(overRecord([answer], record)).toEqual([answer]);
    expect(overRecord([finding('age', {})], record)).toContainEqual(record[0]);
    expect(overRecord([{ ...answer, stage: { kind: 'watch' } }], record)).toContainEqual(record[0]);
  });
});
