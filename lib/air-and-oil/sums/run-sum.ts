import { band, type Band, type Reading } from '../band';
import { requireWithin } from '../out-of-range';
import type { Outcome, Sum, SumInput, Values } from './sum';

/** What a page or a caller of the API gives: by the ids of inputs, in SI; nothing for an input that is left empty. */
export type Given = Readonly<Record<string, number | undefined>>;

/** A value typed at a bound may pass it by the last bits of its conversion, and is meant to be at it. */
const LAST_BITS = 1e-12;

/**
 * The inputs of a sum with defaults in the place of optional ones that were left empty.
 *
 * @throws OutOfRange whose field is the id of an input; where a needed one is missing, `given` is NaN
 */
export function completeInputs(sum: Sum, given: Given): Values {
  return Object.fromEntries(sum.inputs.map((input) => [input.id, completed(input, given[input.id])]));
}

function completed({ id, quantity, optional, byDefault, least, most }: SumInput, given: number | undefined): number {
  const value = given ?? (optional ? byDefault : NaN);
  const near = (bound: number) => Math.abs(value - bound) <= LAST_BITS * Math.abs(bound);
  if (near(least)) return least;
  if (near(most)) return most;
  requireWithin(id, quantity, value, { least, most });
  return value;
}

/**
 * A sum on what was given.
 *
 * @throws OutOfRange whose field is the id of an input
 * @example runSum(sumOf('time-loaded'), { loaded: 90, unloaded: 630, delivery: 0.58 }).values.share // 0.125
 */
export function runSum(sum: Sum, given: Given): Outcome {
  return sum.compute(completeInputs(sum, given));
}

export interface BandOptions {
  /** Half-widths that the person gave in place of the usual ones, in SI, by the id of the input. */
  readonly halfWidths?: Given;
  /** The output that is meant; the main one where nothing is said. */
  readonly output?: string;
}

/**
 * How far a sum can be off, from how far its inputs can.
 *
 * @returns undefined where the sum comes to nothing for the inputs as given
 * @throws OutOfRange as `runSum`
 * @example bandOf(sumOf('time-loaded'), { loaded: 90, unloaded: 630, delivery: 0.58 })
 */
export function bandOf(sum: Sum, given: Given, { halfWidths = {}, output = sum.main }: BandOptions = {}): Band | undefined {
  const inputs = completeInputs(sum, given);
  const readings = Object.fromEntries(sum.inputs.map((input) => [input.id, readingOf(input, inputs, halfWidths[input.id])]));
  return band((moved) => {
    const outcome = sum.compute(moved);
    return outcome.kind === 'values' ? outcome.values[output] : undefined;
  }, readings);
}

function readingOf({ id, halfWidth, totalOf }: SumInput, inputs: Values, said: number | undefined): Reading {
  const value = inputs[id] ?? NaN;
  return { value, halfWidth: said ?? halfWidth(value), times: totalOf === undefined ? 1 : inputs[totalOf] };
}

/** One place along a plot. */
export interface PlotPoint {
  readonly x: number;
  /** By output; undefined where the sum comes to nothing. */
  readonly y: Readonly<Record<string, number | undefined>>;
}

/**
 * The lines of a sum's plot around what was given.
 *
 * @param steps of the x axis, all alike; one point more than that
 * @returns no points where the sum has no plot
 * @throws OutOfRange as `runSum`
 */
export function plotPoints(sum: Sum, given: Given, steps = 80): PlotPoint[] {
  const { plot } = sum;
  if (!plot) return [];
  const inputs = completeInputs(sum, given);
  const [from, to] = plot.range(inputs);
  return Array.from({ length: steps + 1 }, (_, i) => {
    const x = from + ((to - from) * i) / steps;
    const outcome = sum.compute({ ...inputs, [plot.x]: x });
    const values = outcome.kind === 'values' ? outcome.values : {};
    return { x, y: Object.fromEntries(plot.series.map((id) => [id, values[id]])) };
  });
}
