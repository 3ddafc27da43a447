/** What a search for a root came to. Never a number that is not one. */
export type Root =
  | { readonly converged: true; readonly root: number; readonly iterations: number }
  | { readonly converged: false; readonly because: 'no change of sign' | 'too many iterations' };

interface Bracket {
  readonly from: number;
  readonly to: number;
  /** How near two guesses must come, relative to their size. */
  readonly relative?: number;
  readonly mostIterations?: number;
}

/**
 * A root of a continuous function between two points where its signs differ, by regula falsi with the Illinois
 * modification, falling back to bisection where that is slow.
 *
 * @returns the root, or why there is none. Both ends may be infinitely steep; neither may be NaN
 * @see G. Dahlquist and A. Bjorck, Numerical Methods (1974), 6.4
 * @example findRoot((x) => x * x - 2, { from: 0, to: 2 }) // { converged: true, root: 1.41421356..., ... }
 */
export function findRoot(f: (x: number) => number, { from, to, relative = 1e-13, mostIterations = 200 }: Bracket): Root {
  let [a, b, fa, fb] = [from, to, f(from), f(to)];
  if (fa === 0) return { converged: true, root: a, iterations: 0 };
  if (fb === 0) return { converged: true, root: b, iterations: 0 };
  if (!(fa < 0 !== fb < 0)) return { converged: false, because: 'no change of sign' };

  for (let iterations = 1, kept = 0; iterations <= mostIterations; iterations += 1) {
    const secant = b - (fb * (b - a)) / (fb - fa);
    // Every third step halves, so that the bracket itself closes.
    const x = iterations % 3 === 0 || !(secant > Math.min(a, b) && secant < Math.max(a, b)) ? (a + b) / 2 : secant;
    const fx = f(x);
    if (fx === 0 || Math.abs(b - a) <= relative * Math.abs(x)) return { converged: true, root: x, iterations };
    if (fx < 0 === fa < 0) {
      [a, fa] = [x, fx];
      if (kept === 1) fb /= 2;
      kept = 1;
    } else {
      [b, fb] = [x, fx];
      if (kept === -1) fa /= 2;
      kept = -1;
    }
  }
  return { converged: false, because: 'too many iterations' };
}
