import { BAND_COVERAGE, type BandCoverage } from '@/lib/air-and-oil/band-coverage';
import { formatQuantity, formatValue } from '@/lib/units';
import type { Writing } from './read-texts';

/** A band that promises 95 % and holds so much keeps its promise well enough. */
const KEPT = { least: 0.93, most: 0.97 };

/**
 * How often the true value lay within the band of a sum, in words; plainly so where the band doesn't keep its promise.
 *
 * @param coverage by sum, shares of 1
 * @returns undefined for a sum without a row: none of its readings has an error
 * @example coverageText('build-up', { units: US_UNITS })
 * // 'Tried 50,000 times with …, the true value lay within the band in 95.0 %; with three times that error, in 94.9 %.'
 */
export function coverageText(sumId: string, { decimal }: Writing, coverage: Readonly<Record<string, BandCoverage>> = BAND_COVERAGE): string | undefined {
  const found = coverage[sumId];
  if (!found) return undefined;
  const { usual, tripled, draws } = found;
  const percent = (share: number) => formatQuantity(share, { quantity: 'ratio', unit: 'percent', digits: 1, decimal });
  const times = formatValue(draws, { quantity: 'count', unit: 'one', digits: 0, decimal });
  const tried = `Tried ${times} times with each reading off by anything up to its usual error, the true value lay within the band in ${percent(usual)}; with three times that error, in ${percent(tripled)}.`;
  return [tried, warning(usual, tripled)].filter(Boolean).join(' ');
}

function warning(usual: number, tripled: number): string | undefined {
  if (usual < KEPT.least) return 'The band is narrower than it promises.';
  if (usual > KEPT.most) return 'The band is wider than it promises.';
  if (tripled < KEPT.least) return 'With readings that coarse the band is narrower than it promises.';
  if (tripled > KEPT.most) return 'With readings that coarse the band is wider than it promises.';
  return undefined;
}
