import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { compileRulebook, rank } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { InputError } from '@/scripts/rank/input-error';
import { listChecks, listText } from '@/scripts/rank/list';
import { reportText } from '@/scripts/rank/print';
import { readInput } from '@/scripts/rank/read-findings';
import { reportOn } from '@/scripts/rank/report';
import { book, cause, choice, measured, rule, somethingElse } from '@/tests/support/rulebook-parts';

vi.setConfig({ testTimeout: 60_000 });

const small = book({
  causes: [somethingElse(0.2), cause('worn', 0.3), cause('choked', 0.5)],
  checks: [
    choice('noise', { knock: 0.2, none: 0.8 }),
    choice('opening', { large: 0.7, small: 0.3 }, { fromRecord: { fact: 'drainOpening', states: { 'small-hole': 'small' } } }),
    measured('pressure', [100_000, 200_000], [0.3, 0.4, 0.3], { unit: 'kPa', range: { min: 0, max: 1_000_000 }, usualError: 5000 }),
    measured('head', [400, 450], [0.3, 0.4, 0.3], { quantity: 'temperature', unit: 'degC' }),
    measured('age', [1000], [0.3, 0.7], { quantity: 'distance', unit: 'mi', fromRecord: { fact: 'milesSinceFit' } }),
  ],
  rules: [rule('knock', { noise: 'knock' }, { worn: 6 }, { note: 'A worn bearing knocks.' })],
});
const compiled = compileRulebook(small);
const read = (json: unknown) => readInput(JSON.stringify(json), compiled);
const reading = (json: unknown) => read({ findings: [json] }).findings[0]?.shares;

describe('a file of findings', () => {
  it('is read in its short and in its full form', () => {
    const short = read({ findings: { noise: 'knock', pressure: '150 kPa', opening: 'skip' } });
    const full = read({
      findings: [
        { check: 'noise', answer: 'knock' },
        { check: 'pressure', value: 150 },
        { check: 'opening', answer: "can't tell" },
      ],
    });
    expect(short).toEqual(full);
    expect(short.findings.map(({ shares }) => shares.length)).toEqual([1, 1, 0]);
  });

  it('takes readings in any unit, or as numbers in the check’s own', () => {
    expect(reading({ check: 'pressure', value: '22 psi', error: 0 })).toEqual([{ state: 'band-1', share: 1 }]);
    expect(reading({ check: 'pressure', value: 100, error: 0 })).toEqual([{ state: 'band-1', share: 1 }]);
    expect(reading({ check: 'pressure', value: '1 bar', error: '10 kPa' })?.map(({ state }) => state)).toEqual(['band-0', 'band-1']);
  });

  it('takes the usual error where none is given', () => {
    expect(reading({ check: 'pressure', value: 100 })?.map(({ share }) => Number(share.toFixed(9)))).toEqual([0.5, 0.5]);
  });

  it('takes the error of a temperature for a difference', () => {
    // 126.85 degC is 400 K; an error of 9 degF is 5 K.
    const shares = reading({ check: 'head', value: 126.85, error: '9 F' });
    expect(shares?.map(({ share }) => Number(share.toFixed(9)))).toEqual([0.5, 0.5]);
  });

  it('marks "think so"', () => {
    expect(read({ findings: [{ check: 'noise', answer: 'knock', sure: false }] }).findings[0]?.reliability).toBe(0.8);
  });

  it('takes record facts, with units where a measured check asks for them', () => {
    expect(read({ findings: {}, record: { milesSinceFit: '1 km', drainOpening: 'small-hole' } }).facts).toEqual({ milesSinceFit: 1000, drainOpening: 'small-hole' });
  });

  it.each<[string, unknown, RegExp]>([
    ['without findings', {}, /must be \{ "findings"/],
    ['with an unknown key', { findings: {}, reccord: {} }, /unknown key "reccord"/],
    ['with an unknown key in a finding', { findings: [{ check: 'noise', anwser: 'knock' }] }, /unknown key "anwser"/],
    ['that is a list', [], /must be/],
    ['with an unknown check', { findings: { nose: 'knock' } }, /no check "nose"; npm run rank -- --list/],
    ['with an unknown answer', { findings: { noise: 'thud' } }, /"noise" has no answer "thud", only knock, none/],
    ['with a number for an answer', { findings: { noise: 3 } }, /3 is not one of its answers/],
    ['with a check twice', { findings: [{ check: 'noise', answer: 'knock' }, { check: 'noise', answer: 'none' }] }, /answered twice/],
    ['with a finding that says nothing', { findings: [{ check: 'noise' }] }, /needs "answer": knock, none/],
    ['with both answer and value', { findings: [{ check: 'pressure', answer: 'band-0', value: 3 }] }, /not both/],
    ['with an answer for a reading', { findings: [{ check: 'pressure', answer: 'band-0' }] }, /is measured: give "value"/],
    ['with a value for an answer', { findings: [{ check: 'noise', value: 3 }] }, /needs "answer"/],
    ['with an error for an answer', { findings: [{ check: 'noise', answer: 'knock', error: 3 }] }, /no "error"/],
    ['with a reading out of range', { findings: { pressure: '2000 kPa' } }, /"2000 kPa" is out of its range/],
    ['with a reading in another unit', { findings: { pressure: '3 mm' } }, /check "pressure": .*mm/],
    ['with a reading that is none', { findings: { pressure: '12abc' } }, /check "pressure": .*12abc/],
    ['with an error below nothing', { findings: [{ check: 'pressure', value: 100, error: -1 }] }, /error/],
    ['with a fact that nothing asks for', { findings: {}, record: { miles: 3 } }, /no check asks for "miles"; known: drainOpening, milesSinceFit/],
  ])('%s is refused in one line', (_name, json, message) => {
    const refusal = (() => {
      try {
        read(json);
      } catch (error) {
        return error;
      }
      return undefined;
    })();
    expect(refusal).toBeInstanceOf(InputError);
    expect(String(refusal)).toMatch(message);
    expect(String(refusal)).not.toMatch(/\n/);
  });

  it('that is not JSON is refused in one line', () => {
    expect(() => readInput('{ findings: }', compiled)).toThrow(/^not JSON: [^\n]*$/);
  });
});

describe('the report', () => {
  it('is the ranking of the findings and of what the record adds', async () => {
    const input = read({ findings: { noise: 'knock' }, record: { drainOpening: 'small-hole' } });
    const report = await reportOn(compiled, input);
    expect(report.agreed).toBe(true);
    expect(report.fromRecord).toEqual(['opening']);
    expect(report.causes.map(({ causeId, p }) => [causeId, p])).toEqual(rank(compiled, input.findings).causes.map(({ causeId, p }) => [causeId, p]));
    expect(report.nextChecks.flatMap(({ checkIds }) => checkIds)).not.toContain('noise');
  });

  it('names causes, weights, words, notes and next checks for people', async () => {
    const text = reportText(await reportOn(compiled, read({ findings: { noise: 'knock' } })));
    expect(text).toMatch(/ 1 +\d+ % {2}worn/);
    expect(text).toMatch(/\+6\.0 dB {2}clearly for: noise\. A worn bearing knocks\. \[judgement\]/);
    expect(text).toMatch(/Next checks:|Enough is known; repair:/);
  });

  it('says so when nothing fits', async () => {
    const text = reportText(await reportOn(compiled, read({ findings: {} })));
    expect(text).not.toMatch(/doesn’t fit/);
    const misfit = compileRulebook(book({ ...small, causes: [somethingElse(0.8), cause('worn', 0.1), cause('choked', 0.1)] }));
    expect(reportText(await reportOn(misfit, readInput('{"findings":{}}', misfit)))).toMatch(/^This doesn’t fit well/);
  });
});

describe('the list of checks', () => {
  it('has every check of the default rulebook, with its answers, and bands in its unit', () => {
    const list = listChecks(compileRulebook(defaultRulebook));
    expect(list.map(({ id }) => id)).toEqual(defaultRulebook.checks.map(({ id }) => id));
    expect(list.every(({ prompt, answers }) => prompt !== '' && answers.length >= 2)).toBe(true);
    expect(list.filter(({ kind }) => kind === 'measured').every(({ answers }) => answers.every(({ band }) => band !== undefined && band !== ''))).toBe(true);
  });
  it('shows bands half-open', () => {
    expect(listText(listChecks(compiled))).toMatch(/below 100 kPa: band 0\n {4}100 kPa to below 200 kPa: band 1\n {4}200 kPa or more: band 2/);
  });
});

describe('npm run rank', () => {
  let folder = '';
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'rank-'));
    writeFileSync(join(folder, 'rulebook.json'), JSON.stringify(small));
    writeFileSync(join(folder, 'good.json'), JSON.stringify({ findings: { noise: 'knock' } }));
    writeFileSync(join(folder, 'bad.json'), JSON.stringify({ findings: { noise: 'thud' } }));
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  const run = (...args: string[]) =>
    new Promise<{ code: number; out: string; err: string }>((resolve) => {
      execFile(process.execPath, ['--import', 'tsx', 'scripts/rank.ts', ...args], (error, out, err) => {
        resolve({ code: typeof error?.code === 'number' ? error.code : 0, out, err });
      });
    });

  it('ranks with another rulebook, as JSON for scripts', async () => {
    const { code, out, err } = await run('--rulebook', join(folder, 'rulebook.json'), '--json', join(folder, 'good.json'));
    expect({ code, err }).toEqual({ code: 0, err: '' });
    expect(JSON.parse(out)).toMatchObject({ agreed: true, fired: ['knock'], causes: [{ causeId: 'worn' }, {}, {}] });
  });

  it.each([
    ['no file', [], /^rank: give one file/],
    ['a file that is not there', ['nowhere.json'], /^rank: can’t read nowhere\.json/],
    ['an unknown option', ['--jsno'], /^rank: .*--jsno/],
    ['a rulebook that is none', ['--rulebook', 'package.json', 'package.json'], /^rank: package\.json: .*unknown key|missing/],
    ['findings that don’t fit', ['--rulebook', 'RULEBOOK', 'BAD'], /^rank: "noise" has no answer "thud"/],
  ])('ends with 1 and one line for %s', async (_name, args, message) => {
    const { code, out, err } = await run(...args.map((arg) => (arg === 'RULEBOOK' ? join(folder, 'rulebook.json') : arg === 'BAD' ? join(folder, 'bad.json') : arg)));
    expect(code).toBe(1);
    expect(out).toBe('');
    expect(err).toMatch(message);
    expect(err.trim()).not.toMatch(/\n/);
  });
});
