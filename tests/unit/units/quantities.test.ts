import { describe, expect, it } from 'vitest';
import { QUANTITIES, QUANTITY_IDS, isQuantity, isUnitOf, parseQuantity, unitDefinition, unitsOf } from '@/lib/units';
import { spellingsOf } from '@/lib/units/spelling';

describe.each(QUANTITY_IDS)('%s', (quantity) => {
  it('has no spelling that two of its units share', () => {
    const seen = new Map<string, string>();
    for (const { unit, spelling } of spellingsOf(quantity)) {
      expect(seen.get(spelling) ?? unit, `'${spelling}'`).toBe(unit);
      seen.set(spelling, unit);
    }
  });

  it('understands the id, the symbol, the name and every spelling of its units', () => {
    for (const id of unitsOf(quantity)) {
      const { symbol, name, spellings } = unitDefinition(quantity, id);
      for (const written of [id, symbol, name, ...spellings].filter((text) => text !== '')) {
        const [defaultUnit] = unitsOf(quantity).filter((other) => other !== id).concat(id);
        const parsed = parseQuantity(`2 ${written}`, { quantity, defaultUnit: defaultUnit ?? id });
        expect(parsed, `2 ${written}`).toMatchObject({ ok: true, value: 2, unit: id });
      }
    }
  });

  it('understands its own examples', () => {
    for (const example of QUANTITIES[quantity].examples) {
      for (const defaultUnit of unitsOf(quantity).slice(0, 2)) {
        expect(parseQuantity(example, { quantity, defaultUnit }), example).toMatchObject({ ok: true });
      }
    }
  });

  it('has factors and decimals that make sense', () => {
    for (const { factor, digits } of unitsOf(quantity).map((id) => unitDefinition(quantity, id))) {
      expect(factor).toBeGreaterThan(0);
      expect(Number.isInteger(digits)).toBe(true);
    }
  });
});

describe('guards', () => {
  it('know ids, and no inherited names', () => {
    expect(isQuantity('pressure')).toBe(true);
    expect(isQuantity('toString')).toBe(false);
    expect(isUnitOf('pressure', 'psi')).toBe(true);
    expect(isUnitOf('pressure', 'mm')).toBe(false);
    expect(isUnitOf('pressure', 'constructor')).toBe(false);
  });
});
