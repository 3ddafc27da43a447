import { describe, expect, it } from 'vitest';
import { METRIC_UNITS, QUANTITY_IDS, US_UNITS, isUnitOf, unitFor, unitsOf, withUnits, type Quantity, type UnitId } from '@/lib/units';

const UNIT_PAIRS = QUANTITY_IDS.flatMap((quantity) => unitsOf(quantity).map((unit): [Quantity, UnitId] => [quantity, unit]));

describe('presets', () => {
  it.each(QUANTITY_IDS)('have a unit of %s', (quantity) => {
    expect(isUnitOf(quantity, US_UNITS[quantity])).toBe(true);
    expect(isUnitOf(quantity, METRIC_UNITS[quantity])).toBe(true);
  });
});

describe('unitFor', () => {
  it('is what the person set', () => {
    expect(unitFor(US_UNITS, 'pressure')).toBe('psi');
    expect(unitFor(METRIC_UNITS, 'pressure')).toBe('kPa');
    expect(unitFor(withUnits(METRIC_UNITS, { pressure: 'bar' }), 'pressure', 'psi')).toBe('bar');
  });

  it.each<[Quantity, UnitId, us: UnitId, metric: UnitId]>([
    ['length', 'in', 'in', 'mm'],
    ['length', 'ft', 'ft', 'm'],
    ['length', 'm', 'ft', 'm'],
    ['length', 'cm', 'in', 'mm'],
    ['volume', 'in3', 'in3', 'L'],
    ['volume', 'L', 'gal', 'L'],
    ['volume', 'mL', 'floz', 'mL'],
    ['pressure', 'inH2O', 'inH2O', 'mbar'],
    ['pressure', 'bar', 'psi', 'kPa'],
    ['mass', 'kg', 'lb', 'kg'],
    ['flow', 'gal/min', 'gal/min', 'L/min'],
    ['duration', 'yr', 'yr', 'yr'],
    ['ratio', 'one', 'one', 'one'],
    ['temperature', 'degC', 'degF', 'degC'],
  ])('keeps the size of a %s written in %s: %s or %s', (quantity, like, us, metric) => {
    expect(unitFor<Quantity>(US_UNITS, quantity, like)).toBe(us);
    expect(unitFor<Quantity>(METRIC_UNITS, quantity, like)).toBe(metric);
  });

  it.each(UNIT_PAIRS)('%s like %s is a unit of that quantity, and stays when asked again', (quantity, like) => {
    for (const preferences of [US_UNITS, METRIC_UNITS]) {
      const unit = unitFor<Quantity>(preferences, quantity, like);
      expect(isUnitOf(quantity, unit)).toBe(true);
      expect(unitFor<Quantity>(preferences, quantity, unit)).toBe(unit);
    }
  });
});

describe('withUnits', () => {
  it('takes what it knows and leaves the rest', () => {
    const stored: Record<string, unknown> = { pressure: 'bar', length: 'furlong', colour: 'red', volume: 7, toString: 'psi' };
    expect(withUnits(US_UNITS, stored)).toEqual({ ...US_UNITS, pressure: 'bar' });
  });
});
