import type { Month } from './season';

type Three = readonly [number, number, number];

/** log mean = log exposure + b0 + b1 cos + b2 sin of the middle of the month, 2 pi (m - 1/2) / 12. */
export interface Harmonic {
  readonly coefficients: Three;
  /** Against one rate for all months, two degrees of freedom. */
  readonly likelihoodRatio: number;
  /** Pearson's chi-squared over its degrees of freedom: above 1, months vary by more than chance. */
  readonly dispersion: number;
}

const MOST_STEPS = 50;

/**
 * One wave a year through monthly counts, Poisson, by Newton's steps from one rate for all.
 *
 * @param months with exposure, more than three; some failures among them
 * @returns undefined when the steps do not settle
 */
export function fitHarmonic(months: readonly Month[]): Harmonic | undefined {
  const rows = months.map(({ month, count, exposure }) => {
    const angle = (2 * Math.PI * (month - 0.5)) / 12;
    return { count, exposure, x: [1, Math.cos(angle), Math.sin(angle)] as const };
  });
  const all = rows.reduce((sum, { count, exposure }) => ({ count: sum.count + count, exposure: sum.exposure + exposure }), { count: 0, exposure: 0 });
  const even = Math.log(all.count / all.exposure);
  let b: Three = [even, 0, 0];
  const meanOf = ({ exposure, x }: (typeof rows)[number]) => exposure * Math.exp(b[0] + b[1] * x[1] + b[2] * x[2]);
  for (let steps = 0; steps < MOST_STEPS; steps += 1) {
    const score = [0, 0, 0];
    const information = [[0, 0, 0], [0, 0, 0], [0, 0, 0]];
    for (const row of rows) {
      const mu = meanOf(row);
      row.x.forEach((xi, i) => {
        score[i] = (score[i] ?? 0) + xi * (row.count - mu);
        row.x.forEach((xj, j) => {
          const line = information[i] ?? [];
          line[j] = (line[j] ?? 0) + mu * xi * xj;
        });
      });
    }
    const step = solveThree(information, score);
    if (!step) return undefined;
    b = [b[0] + step[0], b[1] + step[1], b[2] + step[2]];
    if (!b.every(Number.isFinite)) return undefined;
    if (step.every((each) => Math.abs(each) < 1e-13 * (1 + Math.abs(b[0])))) {
      return {
        coefficients: b,
        likelihoodRatio: 2 * rows.reduce((sum, row) => sum + row.count * Math.log(meanOf(row) / (row.exposure * Math.exp(even))), 0),
        dispersion: rows.reduce((sum, row) => sum + (row.count - meanOf(row)) ** 2 / meanOf(row), 0) / (rows.length - 3),
      };
    }
  }
  return undefined;
}

/** By Cramer's rule. */
function solveThree(matrix: readonly (readonly number[])[], right: readonly number[]): Three | undefined {
  const column = (j: number) => matrix.map((row) => row[j] ?? 0);
  const determinant = ([a = [], b = [], c = []]: readonly (readonly number[])[]) => {
    const [a0 = 0, a1 = 0, a2 = 0] = a;
    const [b0 = 0, b1 = 0, b2 = 0] = b;
    const [c0 = 0, c1 = 0, c2 = 0] = c;
    return a0 * (b1 * c2 - b2 * c1) - a1 * (b0 * c2 - b2 * c0) + a2 * (b0 * c1 - b1 * c0);
  };
  const [x, y, z] = [column(0), column(1), column(2)];
  const whole = determinant([x, y, z]);
  if (!(Math.abs(whole) > 0)) return undefined;
  return [determinant([right, y, z]) / whole, determinant([x, right, z]) / whole, determinant([x, y, right]) / whole];
}
