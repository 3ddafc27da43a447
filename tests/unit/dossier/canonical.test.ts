import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson, contentHash } from '@/lib/dossier/canonical';

/** The same value with its keys the other way round. */
function turned(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(turned);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).reverse().map(([key, held]) => [key, turned(held)]));
}

describe('canonical JSON', () => {
  it('puts keys in order and nothing between', () => {
    expect(canonicalJson({ b: [1, { d: null, c: 'é "q"' }], a: true, left: undefined })).toBe('{"a":true,"b":[1,{"c":"é \\"q\\"","d":null}]}');
  });

  it('doesn’t depend on the order of keys, nor on having been JSON', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        expect(canonicalJson(turned(value))).toBe(canonicalJson(value));
        expect(canonicalJson(JSON.parse(JSON.stringify(value)))).toBe(canonicalJson(value));
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });

  it('refuses a number that JSON doesn’t know', () => {
    expect(() => canonicalJson({ a: NaN })).toThrow(TypeError);
  });

  it('is hashed by SHA-256 of its UTF-8', () => {
    expect(contentHash({ a: 'é' })).toBe(createHash('sha256').update(Buffer.from('{"a":"é"}', 'utf8')).digest('hex'));
  });
});
