/**
 * How much of each weight of one evidence group counts, for one cause. The weights for and those against are each
 * sorted by size; the j-th counts rho^j (0^0 = 1). Equal weights share the mean of their factors, so that the order
 * in which findings came never matters.
 *
 * rho = 1 is naive Bayes; rho = 0 takes the strongest each way.
 *
 * @param weights weights of the group's findings for one cause, nats
 * @param rho attenuation of the group, [0, 1]
 * @returns the factor of each weight, [0, 1], in the order given; 1 for a weight of zero
 * @example attenuationFactors([1, 3, -2, 2], 0.5) // [0.25, 1, 1, 0.5]
 */
export function attenuationFactors(weights: readonly number[], rho: number): number[] {
  const factors = weights.map(() => 1);
  if (weights.length < 2) return factors;
  for (const sign of [1, -1]) {
    const ranked = weights
      .map((weight, index) => ({ size: sign * weight, index }))
      .filter(({ size }) => size > 0)
      .sort((a, b) => b.size - a.size);
    for (let from = 0; from < ranked.length; ) {
      let to = from;
      let sum = 0;
      while (to < ranked.length && ranked[to]?.size === ranked[from]?.size) {
        sum += rho ** to;
        to += 1;
      }
      for (const { index } of ranked.slice(from, to)) factors[index] = sum / (to - from);
      from = to;
    }
  }
  return factors;
}

/**
 * How much the attenuated sum of one side of a group grows when one more weight joins it. Equal weights share their
 * factors, which does not change their sum, so the place of the new one among equals does not matter.
 *
 * @param sizes sizes of the weights already on that side, nats, largest first
 * @param size size of the new one, > 0
 * @param rho attenuation of the group, [0, 1]
 * @returns the change of sum_j rho^j size_j, nats; never negative
 * @example attenuatedGain([3, 1], 2, 0.5) // 0.5 * 2 - 0.5 * (0.5 * 1) = 0.75
 */
export function attenuatedGain(sizes: readonly number[], size: number, rho: number): number {
  let factor = 1;
  let pushedDown = 0;
  let own = 1;
  for (const other of sizes) {
    if (other < size) pushedDown += factor * other;
    else own *= rho;
    factor *= rho;
  }
  return own * size - (1 - rho) * pushedDown;
}
