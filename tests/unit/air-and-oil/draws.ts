import { bandOf, completeInputs, type Given, type Sum } from '@/lib/air-and-oil/sums';
import { OutOfRange } from '@/lib/air-and-oil/out-of-range';

/** Uniform numbers from 0 to 1 that are the same on every run (mulberry32). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** A case of a sum: what was read, and how far that can be off where it isn't as usual. */
export interface Scenario {
  readonly name: string;
  readonly given?: Given;
  readonly halfWidths?: Given;
}

export function defaultsOf(sum: Sum): Record<string, number> {
  return Object.fromEntries(sum.inputs.map(({ id, byDefault }) => [id, byDefault]));
}

/**
 * The share of draws within the errors of the inputs whose result lies in the band. A draw outside the range of the sum,
 * such as a negative loss, cannot be true and is drawn again.
 */
export function coverage(sum: Sum, { given = {}, halfWidths = {} }: Scenario, draws: number, seed: number): number {
  const inputs = completeInputs(sum, { ...defaultsOf(sum), ...given });
  const band = bandOf(sum, inputs, { halfWidths });
  if (!band) throw new Error(`${sum.id} comes to nothing`);
  const random = seeded(seed);
  let within = 0;
  for (let draw = 0; draw < draws; ) {
    const drawn = Object.fromEntries(
      sum.inputs.map(({ id, halfWidth, totalOf }) => {
        const value = inputs[id] ?? NaN;
        const most = halfWidths[id] ?? halfWidth(value);
        const times = totalOf === undefined ? 1 : (inputs[totalOf] ?? 1);
        const off = Array.from({ length: times }, () => most * (2 * random() - 1)).reduce((total, each) => total + each, 0);
        return [id, value + off];
      }),
    );
    const result = resultOf(sum, drawn);
    if (result === 'out') continue;
    draw += 1;
    if ((result ?? Infinity) <= (band.high ?? Infinity) && (result ?? Infinity) >= (band.low ?? -Infinity)) within += 1;
  }
  return within / draws;
}

function resultOf(sum: Sum, inputs: Record<string, number>): number | undefined | 'out' {
  try {
    const outcome = sum.compute(inputs);
    return outcome.kind === 'values' ? outcome.values[sum.main] : undefined;
  } catch (error) {
    if (error instanceof OutOfRange) return 'out';
    throw error;
  }
}


/** Every input off by up to three times what it usually is. */
export function tripled(sum: Sum): Scenario {
  return { name: 'three times the usual errors', halfWidths: Object.fromEntries(sum.inputs.map(({ id, halfWidth, byDefault }) => [id, 3 * halfWidth(byDefault)])) };
}
