import { notEstimable, type NotEstimable } from '../result';
import { logGamma } from '../special/log-gamma';
import { rootBeyond } from '../special/root';
import { requireExposed, totalOf, type Exposed } from './exposed';

/** Rates of a fleet's units vary as a gamma distribution of this shape and mean: rate parameter shape / mean. */
export interface VariedFleet {
  readonly kind: 'varied';
  readonly shape: number;
  readonly mean: number;
  readonly logLikelihood: number;
  /** Of ln shape and ln mean, by observed information: how far the fleet's own figures can be off. */
  readonly covariance: { readonly logShape: number; readonly logMean: number; readonly both: number } | undefined;
}

/** Units differ by no more than chance explains: one rate for all. */
export interface EvenFleet {
  readonly kind: 'even';
  readonly mean: number;
}

/** Above it a fleet is even. */
const GREATEST_SHAPE = 1e6;
const LEAST_SHAPE = 1e-4;

/**
 * How the rates of units vary, from counts that are Poisson about them: the likeliest gamma distribution.
 *
 * @returns not estimable from fewer than two units that ran, or without any failure
 * @throws RangeError
 * @see D. P. Gaver and I. G. O'Muircheartaigh, Technometrics 29, 1987
 * @example const fleet = gammaPoisson(units); if (fleet.kind === 'varied') fleet.shape // 0.822
 */
export function gammaPoisson(units: readonly Exposed[]): VariedFleet | EvenFleet | NotEstimable<'too-few-units' | 'no-failures'> {
  requireExposed(units);
  const ran = units.filter(({ exposure }) => exposure > 0);
  if (ran.length < 2) return notEstimable('too-few-units');
  const total = totalOf(ran);
  if (total.count === 0) return notEstimable('no-failures');
  const likelihood = marginal(ran);
  const slope = (logShape: number) => {
    const shape = Math.exp(logShape);
    return likelihood.slopeInShape(shape, likelihood.meanAt(shape));
  };
  const greatest = Math.log(GREATEST_SHAPE);
  const even: EvenFleet = { kind: 'even', mean: total.count / total.exposure };
  // From below: with few failures the likelihood can fall again towards an even fleet.
  const start = Math.log(LEAST_SHAPE);
  const logShape = slope(start) > 0 ? rootBeyond((u) => slope(Math.min(u, greatest)), start, 0.5, 8) : start;
  if (logShape === undefined || logShape >= greatest) return even;
  const shape = Math.exp(logShape);
  const mean = likelihood.meanAt(shape);
  return { kind: 'varied', shape, mean, logLikelihood: likelihood.at(shape, mean), covariance: likelihood.covariance(shape, mean) };
}

/**
 * The negative binomial likelihood in shape a and mean m. ln G(x + a) - ln G(a) is the sum of ln (a + j) over j < x, so that
 * how many units have more than j failures is all that is needed of the counts.
 */
function marginal(units: readonly Exposed[]) {
  const most = units.reduce((least, { count }) => Math.max(least, count), 0);
  const above = new Float64Array(most);
  for (const { count } of units) for (let j = 0; j < count; j += 1) above[j] = (above[j] ?? 0) + 1;
  const total = totalOf(units);
  const sum = (of: (unit: Exposed) => number) => units.reduce((all, unit) => all + of(unit), 0);

  return {
    at: (a: number, m: number) =>
      above.reduce((all, units, j) => all + units * Math.log(a + j), 0) +
      sum(({ count: x, exposure: e }) => x * Math.log(m * e) - x * Math.log(a + m * e) - a * Math.log1p((m * e) / a) - logGamma(x + 1)),
    slopeInShape: (a: number, m: number) =>
      above.reduce((all, units, j) => all + units / (a + j), 0) +
      sum(({ count: x, exposure: e }) => (m * e - x) / (a + m * e) - Math.log1p((m * e) / a)),
    /** The mean that is likeliest at a shape: sum (x - m e) / (a + m e) = 0. */
    meanAt: (a: number) => {
      const crude = Math.log(total.count / total.exposure);
      const slope = (logMean: number) => {
        const m = Math.exp(logMean);
        return sum(({ count: x, exposure: e }) => (a * (x - m * e)) / (a + m * e));
      };
      return Math.exp(rootBeyond(slope, crude, slope(crude) > 0 ? 0.1 : -0.1) ?? crude);
    },
    covariance: (a: number, m: number): VariedFleet['covariance'] => {
      // Second derivatives in ln a and ln m, at the top, where the first are 0.
      let curve = -above.reduce((all, units, j) => all + units / (a + j) ** 2, 0);
      let [mean, both] = [0, 0];
      for (const { count: x, exposure: e } of units) {
        const s = a + m * e;
        curve += 1 / a - 2 / s + (a + x) / (s * s);
        mean += ((a + x) * a * m * e) / (s * s);
        both -= (a * m * e * (x - m * e)) / (s * s);
      }
      const shape = -curve * a * a;
      const determinant = shape * mean - both * both;
      return determinant > 0 && mean > 0 ? { logShape: mean / determinant, logMean: shape / determinant, both: -both / determinant } : undefined;
    },
  };
}
