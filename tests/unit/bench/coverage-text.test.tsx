// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { CoverageNote } from '@/components/bench/CoverageNote';
import { SUMS, sumOf } from '@/lib/air-and-oil/sums';
import { BAND_COVERAGE } from '@/lib/air-and-oil/band-coverage';
import { coverageText } from '@/lib/bench/coverage-text';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';

afterEach(cleanup);

const US = { units: US_UNITS };
const of = (usual: number, tripled: number) => coverageText('x', US, { x: { usual, tripled, draws: 10_000 } });

describe('how far a band is off, in words', () => {
  test('names the draws and both shares, as the person writes numbers', () => {
    expect(coverageText('head-pressure', US)).toBe(
      'Tried 10,000 times with each reading off by anything up to its usual error, the true value lay within the band in 94.6 %; with three times that error, in 93.8 %.',
    );
    expect(coverageText('carry-over', { units: METRIC_UNITS, decimal: ',' })).toMatch(/^Tried 50\u00a0000 times .* in 95,0 %; .* in 95,0 %\.$/);
  });

  test('says plainly where a band does not keep its promise', () => {
    expect(of(0.91, 0.88)).toMatch(/ The band is narrower than it promises\.$/);
    expect(of(0.99, 0.99)).toMatch(/ The band is wider than it promises\.$/);
    expect(of(0.95, 0.929)).toMatch(/ With readings that coarse the band is narrower than it promises\.$/);
    expect(of(0.95, 0.98)).toMatch(/ With readings that coarse the band is wider than it promises\.$/);
    expect(of(0.93, 0.97)).not.toMatch(/promises/);
  });

  test('stands on the page of every sum that has a row, and on no other', () => {
    for (const sum of SUMS) {
      render(<CoverageNote sum={sum} writing={US} />);
      expect(screen.queryAllByTestId('band-coverage'), sum.id).toHaveLength(sum.id in BAND_COVERAGE ? 1 : 0);
      cleanup();
    }
    expect(Object.keys(BAND_COVERAGE).filter((id) => !sumOf(id))).toEqual([]);
  });
});
