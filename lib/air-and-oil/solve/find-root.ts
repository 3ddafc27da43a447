/** What a search for a root came to. Never a number that is not one. */
export type Root =
  | { readonly converged: true; readonly root: number; readonly iterations: number }
  | { readonly converged: false; readonly because: 'no change of sign' | 'too many iterations' };

interface Bracket {
  readonly from: number;
  readonly to: number;
  /** How near two guesses must come, relative to their size (near zero, to a millionth of the bracket). */
  readonly relative?: number;
  readonly mostIterations?: number;
}

/**
 * A root of a continuous function between two points where its signs differ, by Brent's method: inverse quadratic steps
 * where they work, halving where they don't.
 *
 * @returns the root, or why there is none
 * @see R. P. Brent, Algorithms for Minimization without Derivatives (1973), chapter 4
 * @example findRoot((x) => x * x - 2, { from: 0, to: 2 }) // { converged: true, root: 1.41421356..., ... }
 */
export function findRoot(f: (x: number) => number, { from, to, relative = 1e-14, mostIterations = 200 }: Bracket): Root {
  // b is the best guess so far, c lies across the root from it, a is the guess before.
  let [a, b, fa, fb] = [from, to, f(from), f(to)];
  if (fa === 0) return { converged: true, root: a, iterations: 0 };
  if (fb === 0) return { converged: true, root: b, iterations: 0 };
  if (!(fa < 0 !== fb < 0)) return { converged: false, because: 'no change of sign' };
  let [c, fc] = [a, fa];
  let [step, before] = [b - a, b - a];
  const leastSize = 1e-6 * Math.abs(b - a);

  for (let iterations = 1; iterations <= mostIterations; iterations += 1) {
    if (fb < 0 === fc < 0) {
      [c, fc] = [a, fa];
      step = before = b - a;
    }
    if (Math.abs(fc) < Math.abs(fb)) [a, b, c, fa, fb, fc] = [b, c, b, fb, fc, fb];
    const enough = (2 * Number.EPSILON + relative / 2) * Math.max(Math.abs(b), leastSize);
    const half = (c - b) / 2;
    if (fb === 0 || Math.abs(half) <= enough) return { converged: true, root: b, iterations };

    const guess = Math.abs(before) >= enough && Math.abs(fa) > Math.abs(fb) ? interpolated({ a, b, c, fa, fb, fc, half }) : undefined;
    if (guess !== undefined && Math.abs(guess) < Math.min(1.5 * Math.abs(half) - enough / 2, Math.abs(before) / 2) && guess < 0 === half < 0) {
      [before, step] = [step, guess];
    } else {
      step = before = half;
    }
    [a, fa] = [b, fb];
    b += Math.abs(step) > enough ? step : Math.sign(half) * enough;
    fb = f(b);
  }
  return { converged: false, because: 'too many iterations' };
}

/** The step from b by a secant through two points, or by an inverse parabola through three. */
function interpolated({ a, b, c, fa, fb, fc, half }: Record<'a' | 'b' | 'c' | 'fa' | 'fb' | 'fc' | 'half', number>): number {
  const s = fb / fa;
  if (a === c) return (2 * half * s) / (s - 1);
  const [q, r] = [fa / fc, fb / fc];
  return -(s * (2 * half * q * (q - r) - (b - a) * (r - 1))) / ((q - 1) * (r - 1) * (s - 1));
}
