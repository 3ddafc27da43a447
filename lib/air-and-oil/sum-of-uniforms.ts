/** Cells of the grid, from the least sum to the largest that matter. */
const CELLS = 2000;

/** Standard deviations to which the grid reaches at most: less than 1 in 10,000,000 is past it. */
const FAR = 6;

/** A part smaller than this share of the largest moves no quantile that is shown. */
const NEGLIGIBLE = 1e-4;

/**
 * How far a sum of independent errors, each uniform between plus and minus its half-width, stays from zero with a given
 * probability.
 *
 * Neither 1.96 standard deviations nor the sum of the half-widths: one error alone gives 0.95 of its half-width, many of
 * like size come near the normal distribution. The distribution itself is made, by averaging the distribution of the
 * sum so far over the width of each further error: F(x) = 1 / (2 a) integral of F from x - a to x + a, on a fixed grid.
 *
 * @param halfWidths of the errors, of any sign or size; zeros count for nothing
 * @param probability within 0 and 1
 * @returns the half-width of the symmetrical interval, to about 1e-4 of it
 * @see JCGM 101:2008 (GUM supplement 1), propagation of distributions; the convolution is elementary
 * @example
 * sumOfUniforms([1], 0.95)    // 0.95
 * sumOfUniforms([1, 1], 0.95) // 1.5528: the sum of two is a triangle
 */
export function sumOfUniforms(halfWidths: readonly number[], probability: number): number {
  const widths = halfWidths.map(Math.abs).sort((a, b) => b - a);
  const largest = widths[0] ?? 0;
  if (largest === 0) return 0;
  const counted = widths.slice(1).filter((a) => a > NEGLIGIBLE * largest);
  const deviation = Math.sqrt(widths.reduce((sum, a) => sum + a * a, 0) / 3);
  const reach = Math.min(FAR * deviation, widths.reduce((sum, a) => sum + a, 0));
  const step = (2 * reach) / CELLS;
  const at = (i: number) => -reach + i * step;
  let distribution = Float64Array.from({ length: CELLS + 1 }, (_, i) => Math.min(1, Math.max(0, (at(i) + largest) / (2 * largest))));
  for (const a of counted) distribution = averagedOver(distribution, a / step);

  // The distribution is symmetrical, so that one tail tells both.
  const wanted = (1 + probability) / 2;
  const i = distribution.findIndex((share) => share >= wanted);
  const [below, above] = [distribution[i - 1] ?? 0, distribution[i] ?? 1];
  return Math.min(reach, at(i - 1) + ((wanted - below) / (above - below)) * step);
}

/** The mean of a distribution over `halfWidth` cells to both sides of each point. */
function averagedOver(distribution: Float64Array<ArrayBuffer>, halfWidth: number): Float64Array<ArrayBuffer> {
  const integral = new Float64Array(distribution.length);
  for (let i = 1; i < distribution.length; i += 1) integral[i] = (integral[i - 1] ?? 0) + ((distribution[i - 1] ?? 0) + (distribution[i] ?? 0)) / 2;

  const last = distribution.length - 1;
  const total = integral[last] ?? 0;
  /** The integral up to any point: 0 before the grid, growing by 1 a cell after it. */
  const upTo = (x: number) => {
    if (x <= 0) return 0;
    if (x >= last) return total + (x - last);
    const i = Math.floor(x);
    const [from, to] = [distribution[i] ?? 0, distribution[i + 1] ?? 1];
    const part = x - i;
    return (integral[i] ?? 0) + part * (from + (part * (to - from)) / 2);
  };
  return distribution.map((_, i) => (upTo(i + halfWidth) - upTo(i - halfWidth)) / (2 * halfWidth));
}
