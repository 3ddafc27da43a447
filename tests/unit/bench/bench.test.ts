import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { SUMS, sumOf } from '@/lib/air-and-oil/sums';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { GROUPS } from '@/lib/bench/groups';
import { knownInputs } from '@/lib/bench/known-inputs';
import { shownValue } from '@/lib/bench/show';
import { searchOfInputs, searchOfTexts, textsOfSearch } from '@/lib/bench/texts-in-url';
import { siOf, workOut } from '@/lib/bench/work-out';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';

const US = { units: US_UNITS };
const METRIC = { units: METRIC_UNITS, decimal: ',' as const };
const sum = (id: string): Sum => sumOf(id) ?? expect.fail(`no sum ${id}`);
const usual = (of: Sum, writing = US) => Object.fromEntries(of.inputs.map((input) => [input.id, { value: shownValue(input.byDefault, input, writing) }]));

describe('the bench', () => {
  test('shows every sum once', () => {
    expect(GROUPS.flatMap(({ sums }) => [...sums]).sort()).toEqual(SUMS.map(({ id }) => id).sort());
  });

  test('has every sum that a check of the default rulebook names, with that output, in the quantity of the check', () => {
    const named = defaultRulebook.checks.flatMap((check) => (check.sum ? [{ ...check.sum, quantity: check.quantity }] : []));
    expect(named.length).toBeGreaterThan(0);
    for (const { id, output, quantity } of named) expect([id, sumOf(id)?.outputs.find((one) => one.id === output)?.quantity]).toEqual([id, quantity]);
  });

  test.each(SUMS.map((one) => [one.id, one] as const))('%s works out what stands in its fields at first, in either system', (_, one) => {
    expect(workOut(one, usual(one), US).kind).toBe('values');
    expect(workOut(one, usual(one, METRIC), METRIC).kind).toBe('values');
  });
});

describe('what was typed', () => {
  test('is read in the person’s units and by their decimal mark', () => {
    const worked = workOut(sum('time-loaded'), { loaded: { value: '1:30' }, unloaded: { value: '630,5' } }, METRIC);
    expect(worked.kind === 'values' && siOf(worked.inputs)).toMatchObject({ loaded: 90, unloaded: 630.5 });
  });

  test('keeps which were left empty', () => {
    const worked = workOut(sum('time-loaded'), { loaded: { value: '90' }, unloaded: { value: '630' } }, US);
    expect(worked.kind === 'values' && worked.inputs.find(({ id }) => id === 'delivery')?.typed).toBeNull();
  });

  test.each([
    [{ loaded: { value: '' }, unloaded: { value: '630' } }, { loaded: 'Give time loaded.' }],
    [{ loaded: { value: '90', error: '-2' }, unloaded: { value: '630' } }, { 'loaded.error': expect.any(String) as string }],
    [{ loaded: { value: '90 psi' }, unloaded: { value: 'long' } }, { loaded: expect.any(String) as string, unloaded: expect.any(String) as string }],
  ])('is refused beside its field: %j', (texts, errors) => {
    expect(workOut(sum('time-loaded'), texts, US)).toEqual({ kind: 'refused', errors });
  });

  test('widens the band by the error that is given', () => {
    const width = (error?: string) => {
      const worked = workOut(sum('time-loaded'), { loaded: { value: '90', error }, unloaded: { value: '630' } }, US);
      if (worked.kind !== 'values' || worked.band?.low === undefined || worked.band.high === undefined) return NaN;
      return worked.band.high - worked.band.low;
    };
    expect(width('10')).toBeGreaterThan(5 * width());
    expect(width('± 10 s')).toBe(width('10'));
  });

  test('that comes to nothing says why', () => {
    const texts = { ...usual(sum('build-up')), delivery: { value: '5' }, leak: { value: '6' } };
    expect(workOut(sum('build-up'), texts, US)).toMatchObject({ kind: 'never', because: expect.stringContaining('leaks') as string });
  });
});

describe('a build-up put beside what is expected', () => {
  const typed = (more: Record<string, { value: string }> = {}) => ({ time: { value: '30.6 s' }, volume: { value: '3 ft3' }, delivery: { value: '12 cfm' }, ...more });
  const ratio = (more?: Record<string, { value: string }>) => {
    const worked = workOut(sum('build-up-ratio'), typed(more), US);
    return worked.kind === 'values' ? worked.values.ratio : worked;
  };

  test('is twice where 3 ft³ at 12 cfm take 30.6 s over 15 psi: 15.3 s are expected', () => {
    // 3 ft3 x 15 psi / (12 cfm x 14.696 psi) = 0.2552 min
    expect(ratio()).toBeCloseTo(30.6 / (((3 * 15) / (12 * 14.6959)) * 60), 4);
  });

  test('expects more time where it leaks, and none where all leaks away', () => {
    expect(ratio({ leak: { value: '6 cfm' } })).toBeCloseTo(Number(ratio()) / 2, 9);
    expect(ratio({ leak: { value: '12 cfm' } })).toMatchObject({ kind: 'never', because: expect.stringContaining('never fill') as string });
  });
});

describe('the address of a sum', () => {
  test('says the same to somebody who set other units', () => {
    for (const one of SUMS) {
      const texts = usual(one);
      const [here, there] = [workOut(one, texts, US), workOut(one, textsOfSearch(one, searchOfTexts(one, texts, US), METRIC), METRIC)];
      if (here.kind !== 'values' || there.kind !== 'values') return expect.fail(`${one.id} has no values`);
      const [a, b] = [here.values[one.main], there.values[one.main]];
      expect(Math.abs((a ?? NaN) - (b ?? NaN)) / Math.abs(a ?? 1), one.id).toBeLessThan(1e-8);
    }
  });

  test('brings back what stood in the fields', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 100, noNaN: true }), fc.double({ min: 0.01, max: 5, noNaN: true }), (volume, error) => {
        const texts = { volume: { value: volume.toFixed(3), error: error.toFixed(3) } };
        const back = textsOfSearch(sum('leak-down'), searchOfTexts(sum('leak-down'), texts, US), US);
        expect(Number(back.volume?.value)).toBeCloseTo(Number(texts.volume.value), 9);
        expect(Number(back.volume?.error)).toBeCloseTo(Number(texts.volume.error), 9);
      }),
    );
  });

  test('keeps what can’t be understood, for its message, and what the sum has no input for out', () => {
    expect(textsOfSearch(sum('leak-down'), searchOfTexts(sum('leak-down'), { volume: { value: 'three' } }, US), US)).toEqual({ volume: { value: 'three' } });
    expect(textsOfSearch(sum('leak-down'), { case: 'x', nonsense: '1' }, US)).toEqual({});
  });

  test('of a finding leaves empty what was left empty', () => {
    const texts = { loaded: { value: '90 s', error: '2 s' }, unloaded: { value: '10:30' } };
    const worked = workOut(sum('time-loaded'), texts, US);
    expect(worked.kind === 'values' && searchOfInputs({ id: 'time-loaded', inputs: worked.inputs })).toEqual({ loaded: '90 s', 'loaded.error': '2 s', unloaded: '630 s' });
  });

  test('of a finding whose sum is no more is empty', () => {
    expect(searchOfInputs({ id: 'gone', inputs: [] })).toEqual({});
  });
});

test('what the records know fills inputs that there are', () => {
  const facts = { reservoirM3: 0.1, requiredReservoirM3: 0.09, displacementM3: 0.0003, boreM: 0.07, strokeM: 0.04, cylinders: 2, driveRatio: 1.2, lineSizeM: 0.016 };
  for (const one of SUMS) {
    const known = knownInputs(one.id, facts);
    for (const id of Object.keys(known)) expect(one.inputs.map((input) => input.id), one.id).toContain(id);
    expect(knownInputs(one.id, { ...facts, reservoirM3: null }).volume).toBeUndefined();
  }
});
