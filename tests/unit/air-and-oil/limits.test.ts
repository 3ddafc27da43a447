import { describe, expect, it } from 'vitest';
import { PUBLISHED_LIMITS, chamberVolume, publishedLimit } from '@/lib/air-and-oil/limits';
import { fromSi, isUnitOf } from '@/lib/units';

describe('published limits', () => {
  it('each have an id of their own, a figure, a place and a source', () => {
    expect(new Set(PUBLISHED_LIMITS.map(({ id }) => id)).size).toBe(PUBLISHED_LIMITS.length);
    for (const { id, least, most, country, source, quantity, like } of PUBLISHED_LIMITS) {
      expect(least ?? most, id).toBeGreaterThan(0);
      if (least !== undefined && most !== undefined) expect(most, id).toBeGreaterThan(least);
      expect(isUnitOf(quantity, like), id).toBe(true);
      expect(country.length * source.length, id).toBeGreaterThan(0);
    }
  });

  it('never call the 45 s or the psi per minute of the driver’s manual a regulation', () => {
    const american = PUBLISHED_LIMITS.filter(({ country, quantity }) => country === 'United States' && (quantity === 'pressureRate' || quantity === 'duration'));
    expect(american.length).toBeGreaterThan(4);
    for (const { id, standing, source } of american) {
      expect(standing, id).toBe("driver's check");
      expect(source, id).not.toMatch(/CFR/);
    }
  });

  it('hold no limit of discharge temperature: none was found for compressors on vehicles', () => {
    expect(PUBLISHED_LIMITS.filter(({ quantity }) => quantity === 'temperature')).toEqual([]);
  });

  it('cite no rule for plants as one for vehicles', () => {
    for (const { id, source, vehicle } of PUBLISHED_LIMITS) {
      expect(source, id).not.toContain('1910.169');
      if (source.startsWith('29 CFR')) expect(vehicle, id).toBe('not a vehicle');
    }
  });

  it('are found by id, and not by inherited names', () => {
    expect(publishedLimit('us-cut-in-truck')).toMatchObject({ vehicle: 'truck', builtFrom: '1997-03-01' });
    expect(publishedLimit('toString')).toBeUndefined();
  });

  it('count chambers by their rated volume', () => {
    expect(fromSi(chamberVolume({ 20: 2, 30: 4 }), 'volume', 'in3')).toBeCloseTo(464, 9);
    expect(chamberVolume({})).toBe(0);
  });
});
