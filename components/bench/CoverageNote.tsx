import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { coverageText } from '@/lib/bench/coverage-text';
import type { Writing } from '@/lib/bench/read-texts';

/** How far the band of a sum can be trusted, as it was found by drawing; nothing for a sum whose readings have no error. */
export function CoverageNote({ sum, writing }: { sum: Sum; writing: Writing }) {
  const text = coverageText(sum.id, writing);
  return text ? <p className="max-w-prose" data-testid="band-coverage">{text}</p> : null;
}
