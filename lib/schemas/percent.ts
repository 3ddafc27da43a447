/** A share as people read it: whole percent, but neither a false 0 nor a false 100. @example percent(0.004) // '<1%' */
export function percent(value: number): string {
  const share = Math.min(Math.max(value, 0), 1);
  if (share > 0 && share < 0.01) return '<1%';
  if (share < 1 && share > 0.99) return '>99%';
  return `${Math.round(share * 100)}%`;
}
