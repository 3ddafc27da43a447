import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { divergenceBits, entropyBits, forecast, likelihoods, settles } from '@/lib/diagnose/information';

const positive = fc.double({ min: 0.001, max: 1, noNaN: true });
const normalised = (parts: number[]) => {
  const sum = parts.reduce((a, b) => a + b, 0);
  return parts.map((part) => part / sum);
};
const shares = (count: number) => fc.array(positive, { minLength: count, maxLength: count }).map(normalised);
const question = fc.record({ causes: fc.integer({ min: 1, max: 6 }), states: fc.integer({ min: 1, max: 5 }) }).chain(({ causes, states }) =>
  fc.record({
    p: shares(causes),
    background: shares(states),
    logWeights: fc.array(
      fc.array(fc.double({ min: -40, max: 40, noNaN: true }), { minLength: causes, maxLength: causes }).map((row) => Float64Array.from(row)),
      { minLength: states, maxLength: states },
    ),
  }),
);

describe('information', () => {
  it('is never negative and never more than what is left to know', () => {
    fc.assert(fc.property(question, ({ p, background, logWeights }) => {
      const { bits } = forecast(p, likelihoods(background, logWeights));
      expect(bits).toBeGreaterThanOrEqual(0);
      expect(bits).toBeLessThanOrEqual(entropyBits(p) + 1e-9);
    }));
  });

  it('forecasts answers whose posteriors average to what is known now', () => {
    fc.assert(fc.property(question, ({ p, background, logWeights }) => {
      const { chances, posteriors } = forecast(p, likelihoods(background, logWeights));
      expect(chances.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 12);
      p.forEach((now, c) => {
        expect(posteriors.reduce((sum, posterior, v) => sum + (chances[v] ?? 0) * (posterior[c] ?? 0), 0)).toBeCloseTo(now, 12);
      });
    }));
  });

  it('is the mutual information, written out', () => {
    fc.assert(fc.property(question, ({ p, background, logWeights }) => {
      const table = likelihoods(background, logWeights);
      const { chances, bits } = forecast(p, table);
      let written = 0;
      p.forEach((now, c) => table.forEach((row, v) => {
        const chance = row[c] ?? 0;
        if (chance > 0) written += now * chance * Math.log2(chance / (chances[v] ?? 0));
      }));
      expect(bits).toBeCloseTo(written, 9);
    }));
  });

  it('does not overflow at weights of 2000 nats either way', () => {
    const table = likelihoods([0.5, 0.5], [Float64Array.of(2000, -2000), Float64Array.of(-2000, 2000)]);
    expect(table.map((row) => [...row])).toEqual([[1, 0], [0, 1]]);
    expect(forecast([0.5, 0.5], table).bits).toBe(1);
  });

  it('leaves the causes as they are after an answer that can not come', () => {
    expect([...(forecast([0.3, 0.7], [[1, 1], [0, 0]]).posteriors[1] ?? [])]).toEqual([0.3, 0.7]);
  });

  it('gives infinite divergence where the second rules out what the first allows', () => {
    expect(divergenceBits([0.5, 0.5], [1, 0])).toBe(Infinity);
  });
});

describe('the word for what a check settles', () => {
  it.each([
    [0.5, 1, 'settles most'],
    [0.49, 1, 'settles some'],
    [0.05, 1, 'settles some'],
    [0.049, 1, 'settles little'],
    [0.4, 4.5, 'settles some'],
    [0.2, 4.5, 'settles little'],
    [0.2, 0.2, 'settles some'],
    [0.01, 0.01, 'settles little'],
  ])('%d bits of %d: %s', (bits, left, word) => {
    expect(settles(bits, left)).toBe(word);
  });
});
