// @vitest-environment jsdom
import fc from 'fast-check';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it, test } from 'vitest';
import { Marked } from '@/components/search/Marked';
import { foundText } from '@/components/search/words';
import { searchHref, searchInput, searchPageInput } from '@/lib/schemas/search';
import { readAsked } from '@/lib/search/asked';
import { fleetKey, fold, wordsOf } from '@/lib/search/fold';
import { excerpt, markFleetNumber, markWords, type Segment } from '@/lib/search/mark';
import { isNearly, slipsBetween } from '@/lib/search/nearly';

const plain = (segments: readonly Segment[]) => segments.map(({ text }) => text).join('');
const hits = (segments: readonly Segment[]) => segments.filter(({ hit }) => hit).map(({ text }) => text);

describe('what was typed', () => {
  test.each([
    ['Drain, DRAIN choked!', ['drain', 'choked']],
    ['Señal é E\u0301', ['senal', 'e']],
    ['1/8" of an inch', ['1', '8', 'of', 'an', 'inch']],
    ["it's %_\\ 'q':* & | !(<->)", ['it', 's', 'q']],
    ['🔧 — … “ ”', []],
    ['', []],
  ])('“%s” has the words %j', (text, words) => expect(wordsOf(text)).toEqual(words));

  test.each([
    ['T-104', 't104'],
    ['TR 0104', 'tr104'],
    ['007', '7'],
    ['A-000', 'a0'],
    ['10 200', '10200'],
    ['%', ''],
  ])('“%s” as a fleet number is “%s”', (text, key) => expect(fleetKey(text)).toBe(key));

  test.each([
    ['412', 412],
    ['#412', 412],
    ['case 412', 412],
    ['Case #412 ', 412],
    ['case no. 412', 412],
    ['2147483648', null],
    ['99999999999', null],
    ['412a', null],
    ['T-412', null],
    ['case', null],
    ['', null],
  ])('“%s” names the case %s', (text, number) => expect(readAsked(text).caseNumber).toBe(number));

  it('becomes a query that PostgreSQL can read, whatever it is', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (text) => {
        const { tsquery, words } = readAsked(text);
        if (tsquery === null) return words.length === 0;
        // Between the quotes stands nothing that would end them or that is not a word.
        return tsquery.split(' & ').every((part) => /^'[^'\\\s&|!():*<>]+':\*$/u.test(part)) && words.every((word) => fold(word) === word || word.length <= 120);
      }),
    );
  });

  it('is asked for a number that is nearly it only when there is enough to compare', () => {
    expect([['7', false], ['T1', false], ['T10', true], ['drain', false], ['T-104', true]].filter(([text, maybe]) => readAsked(String(text)).maybeMistyped !== maybe)).toEqual([]);
  });
});

describe('marking', () => {
  it('gives back the text, whatever is marked', () => {
    fc.assert(fc.property(fc.string({ unit: 'grapheme' }), fc.array(fc.string({ minLength: 1, maxLength: 3 })), (text, words) => plain(markWords(text, words.flatMap(wordsOf))) === text));
    fc.assert(fc.property(fc.string({ unit: 'grapheme', maxLength: 40 }), fc.string({ maxLength: 5 }), (text, typed) => plain(markFleetNumber(text, fleetKey(typed))) === text));
  });

  it('marks whole words by how they begin, and none in the middle of another', () => {
    expect(hits(markWords('Leaking; leaks, no oil-leak. Bleak', ['leak']))).toEqual(['Leaking', 'leaks', 'leak']);
    expect(hits(markWords('Señor, ÉLAN', ['senor', 'el']))).toEqual(['Señor', 'ÉLAN']);
  });

  test.each([
    ['T-104', 't104', ['T-104']],
    ['TR 0104', '104', ['104']],
    ['T-0104', 't104', ['T-0104']],
    ['B-770', 'b77', ['B-77']],
    ['007', '7', ['7']],
    ['A 00', '0', ['0']],
    ['T-104', 't105', []],
    ['T-104', '', []],
  ])('of the number %s, looked for as %s, marks %j', (number, key, marked) => expect(hits(markFleetNumber(number, key))).toEqual(marked));

  it('cuts a long text around the first word found, between words', () => {
    const long = `${'before '.repeat(40)}gasket ${'after '.repeat(60)}`;
    const cut = excerpt(long, ['gask']);
    expect(hits(cut)).toEqual(['gasket']);
    expect(plain(cut)).toMatch(/^… before .*gasket after .*after …$/);
    expect(plain(cut).length).toBeLessThan(180);
    expect(plain(excerpt('Short\n one', ['one']))).toBe('Short one');
    fc.assert(fc.property(fc.string({ unit: 'grapheme', maxLength: 600 }), fc.string({ maxLength: 3 }), (text, word) => !/[\ud800-\udbff](?![\udc00-\udfff])/.test(plain(excerpt(text, wordsOf(word))))));
  });

  it('is data: what looks like markup is shown as it is', () => {
    const html = renderToStaticMarkup(<Marked segments={markWords('<img src=x> gasket', ['gask'])} />);
    expect(html).toContain('&lt;img src=x&gt; ');
    expect(html).toMatch(/<mark[^>]*>gasket<\/mark>/);
  });
});

describe('a number that is nearly the one typed', () => {
  test.each([
    ['t140', 't104', 1],
    ['t14', 't104', 1],
    ['tr104', 't104', 1],
    ['t1044', 't104', 1],
    ['f104', 't104', 1],
    ['t401', 't104', 2],
    ['', 'abc', 3],
    ['abc', 'abc', 0],
  ])('%s and %s are %d apart', (a, b, slips) => {
    expect(slipsBetween(a, b)).toBe(slips);
    expect(slipsBetween(b, a)).toBe(slips);
  });

  it('forgives one slip, two where there is more to compare; and where the number is somebody’s, letters alone', () => {
    expect(isNearly('t401', 't104', { known: false })).toBe(false);
    expect(isNearly('abc9401', 'abc9104', { known: false })).toBe(true);
    expect(isNearly('t105', 't104', { known: false })).toBe(true);
    expect(isNearly('t105', 't104', { known: true })).toBe(false);
    expect(isNearly('t104', 'tr104', { known: true })).toBe(true);
  });
});

describe('the address of the search', () => {
  it('holds what was asked for, and is read back', () => {
    const href = searchHref('1/8" & more', { kind: 'remedy', id: 'free-the-drain' });
    const { searchParams, hash } = new URL(href, 'http://carryover.test');
    expect(searchPageInput.parse(Object.fromEntries(searchParams))).toEqual({ q: '1/8" & more', read: { kind: 'remedy', id: 'free-the-drain' } });
    expect(hash).toBe('#entry');
  });

  test.each([[{}], [{ q: 'a'.repeat(201), read: 'x' }], [{ q: undefined, read: '' }], [{ read: 'remedy.' }], [{ read: `remedy.${'a'.repeat(99)}` }]])('%j is as if nothing were there', (query) => expect(searchPageInput.parse(query)).toEqual({ q: '', read: null }));

  it('lets control characters part words, and no more than 200 characters in', () => {
    expect(searchInput.parse({ q: 'a\tb\n' })).toEqual({ q: 'a b', limit: 5 });
    expect(searchInput.safeParse({ q: 'a'.repeat(201) }).success).toBe(false);
  });
});

it('counts what is found in words', () => {
  const group = (kind: 'units' | 'rulebook', total: number) => ({ kind, total, hits: [] });
  expect(foundText([group('units', 1), group('rulebook', 12)])).toBe('Found: 1 unit, 12 entries of the rulebook');
  expect(foundText([group('units', 0)])).toBe('Nothing is found');
});
