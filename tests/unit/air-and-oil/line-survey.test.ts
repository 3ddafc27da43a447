import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lineSurvey } from '@/lib/air-and-oil/line-survey';
import { OutOfRange } from '@/lib/air-and-oil/out-of-range';
import { temperature } from '@/lib/units';

const at = (distanceM: number, kelvin: number) => ({ distanceM, temperatureK: temperature(kelvin) });
const sudden = (...points: ReturnType<typeof at>[]) => lineSurvey(points).flatMap(({ sudden: found }, index) => (found ? [index] : []));

describe('a survey along the line', () => {
  it('gives the fall of each stretch, whatever the order of the readings', () => {
    expect(lineSurvey([at(2, 430), at(0, 450), at(3, 435)])).toEqual([
      { fromM: 0, toM: 2, fallK: 20, fallPerM: 10, sudden: undefined },
      { fromM: 2, toM: 3, fallK: -5, fallPerM: -5, sudden: undefined },
    ]);
    expect(lineSurvey([])).toEqual([]);
    expect(lineSurvey([at(1, 400)])).toEqual([]);
  });

  it('finds the one sudden fall, and says how fast it falls beside it', () => {
    expect(lineSurvey([at(0, 450), at(1, 440), at(2, 380), at(3, 375)]).map((stretch) => stretch.sudden)).toEqual([undefined, { besideKPerM: 10 }, undefined]);
    expect(sudden(at(0, 450), at(1, 440), at(2, 425), at(3, 360))).toEqual([2]);
  });

  it('never calls the first stretch sudden, nor one that is within what two readings can be off', () => {
    expect(sudden(at(0, 450), at(1, 350), at(2, 345), at(3, 342))).toEqual([]);
    expect(sudden(at(0, 450), at(1, 449), at(2, 440), at(3, 439))).toEqual([]);
    expect(sudden(at(0, 450), at(1, 449), at(2, 438), at(3, 437))).toEqual([1]);
  });

  it('calls nothing sudden on a free line, which cools as e^(-x/l) towards its surroundings', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 310, max: 550, noNaN: true }),
        fc.double({ min: 230, max: 305, noNaN: true }),
        fc.double({ min: 0.5, max: 30, noNaN: true }),
        fc.uniqueArray(fc.integer({ min: 0, max: 60 }), { minLength: 3, maxLength: 8 }),
        (hot, around, length, tenths) => {
          const points = tenths.map((x) => at(x / 10, around + (hot - around) * Math.exp(-x / 10 / length)));
          expect(sudden(...points)).toEqual([]);
        },
      ),
    );
  });

  it('does not depend on where the zero of the scale lies', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 300, max: 500 }), { minLength: 3, maxLength: 8 }), fc.integer({ min: -50, max: 50 }), (kelvins, shift) => {
        expect(sudden(...kelvins.map((k, x) => at(x, k + shift)))).toEqual(sudden(...kelvins.map((k, x) => at(x, k))));
      }),
    );
  });

  it.each([
    ['two at one distance', [at(1, 400), at(1, 390)], 'distanceM'],
    ['one before the port', [at(-1, 400), at(1, 390)], 'distanceM'],
    ['no temperature', [at(0, NaN), at(1, 390)], 'temperatureK'],
  ])('refuses %s', (_, points, field) => {
    expect(() => lineSurvey(points)).toThrow(OutOfRange);
    expect(() => lineSurvey(points)).toThrow(field);
  });
});
