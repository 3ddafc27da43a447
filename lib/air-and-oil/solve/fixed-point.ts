/** Where repeated substitution came to rest, or that it did not. */
export type FixedPoint =
  | { readonly converged: true; readonly value: number; readonly iterations: number }
  | { readonly converged: false; readonly last: number };

interface Start {
  readonly from: number;
  readonly relative?: number;
  readonly mostIterations?: number;
}

/**
 * The value that a function gives back unchanged, by repeated substitution.
 *
 * It converges where the function changes less than its argument does, which is for the caller to know; where it does
 * not, it says so.
 *
 * @example fixedPoint(Math.cos, { from: 1 }) // { converged: true, value: 0.739085..., ... }
 */
export function fixedPoint(f: (x: number) => number, { from, relative = 1e-13, mostIterations = 200 }: Start): FixedPoint {
  let x = from;
  for (let iterations = 1; iterations <= mostIterations; iterations += 1) {
    const next = f(x);
    if (Math.abs(next - x) <= relative * Math.abs(next)) return { converged: true, value: next, iterations };
    x = next;
  }
  return { converged: false, last: x };
}
