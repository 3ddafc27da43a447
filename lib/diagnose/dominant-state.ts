/**
 * Index of the state with the largest share; in a tie the lower band. Compound rules see this one.
 *
 * @param states indices and shares, lower bands first; at least one
 * @returns index of the dominant state
 * @example dominantState([{ index: 1, share: 0.5 }, { index: 2, share: 0.5 }]) // 1
 */
export function dominantState(states: readonly { index: number; share: number }[]): number {
  return states.reduce((best, state) => (state.share > best.share ? state : best)).index;
}
