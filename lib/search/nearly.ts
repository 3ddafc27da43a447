/** From this length on two mistakes are forgiven instead of one. */
const LONG = 6;

/**
 * Whether the number that is kept may be what was meant by the one typed, both as `fleetKey` has them: at most a slip or
 * two apart. Where the number typed is somebody's, only one with other letters is: "TR 0104" for "T104", and not "T-105".
 * @example isNearly('t140', 't104', { known: false }) // true
 */
export function isNearly(typed: string, held: string, { known }: { known: boolean }): boolean {
  if (known && digitsOf(typed) !== digitsOf(held)) return false;
  return slipsBetween(typed, held) <= (typed.length >= LONG ? 2 : 1);
}

const digitsOf = (key: string) => key.replaceAll(/\D/g, '');

/** Characters left out, put in, mistaken or swapped with the next: Damerau and Levenshtein's distance, none touched twice. */
export function slipsBetween(a: string, b: string): number {
  const [from, to] = [[...a], [...b]];
  let before: number[] = [];
  let last = Array.from({ length: to.length + 1 }, (_, j) => j);
  from.forEach((char, i) => {
    const row = [i + 1];
    to.forEach((other, j) => {
      const swapped = i > 0 && j > 0 && char === to[j - 1] && from[i - 1] === other ? at(before, j - 1) + 1 : Infinity;
      row.push(Math.min(at(last, j + 1) + 1, at(row, j) + 1, at(last, j) + (char === other ? 0 : 1), swapped));
    });
    [before, last] = [last, row];
  });
  return at(last, to.length);
}

const at = (row: readonly number[], place: number) => row[place] ?? Infinity;
