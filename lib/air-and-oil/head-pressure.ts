import { absolutePressure, type AbsolutePressure, type Temperature } from '@/lib/units';
import { GAS_CONSTANT_AIR, HEAT_CAPACITY_RATIO } from './air';
import { dischargeTemperature } from './discharge-temperature';
import { lineFrictionFactor, massFlowOf, massFlux, upstreamPressure } from './line-friction';
import { criticalFlowConstant } from './orifice-flow';
import { ABOVE_ZERO, requireNotNegative, requireWithin } from './out-of-range';
import { findRoot } from './solve/find-root';
import { fixedPoint } from './solve/fixed-point';

/** A discharge line whose first part, from the head, has lost bore to carbon. */
export interface RestrictedLine {
  readonly lengthM: number;
  readonly nominalBoreM: number;
  /** m, from the head; no more than the line has. */
  readonly narrowedLengthM: number;
  /** m, left open; no more than nominal. */
  readonly narrowedBoreM: number;
}

/** What the compressor sends into the line. */
export interface Delivery {
  readonly freeAirFlowM3PerS: number;
  /** kg/m3, of the air that the flow is counted in. */
  readonly freeAirDensityKgPerM3?: number;
  readonly inletTemperatureK: Temperature;
  readonly inletPressurePa: AbsolutePressure;
  /** Index of compression, 1 to 1.6. */
  readonly index: number;
  /** Pa, absolute, where the line ends. */
  readonly systemPressurePa: AbsolutePressure;
}

/** Pa, absolute (711 psig): past it no head holds, and the answer is only that it is past. */
export const MOST_HEAD_PRESSURE = absolutePressure(5e6);

/** A square-edged entrance into a short tube (handbook value, from memory). */
export const ENTRY_COEFFICIENT = 0.82;

export type HeadPressure =
  | {
      readonly kind: 'settled';
      readonly headPressurePa: AbsolutePressure;
      readonly headTemperatureK: Temperature;
      /** What the line takes, Pa. */
      readonly lossPa: number;
      /** Whether air leaves the narrowed part at the speed of sound, or enters it so. */
      readonly choked: boolean;
      readonly frictionFactor: number;
      readonly iterations: number;
    }
  /** The head would pass `MOST_HEAD_PRESSURE`. */
  | { readonly kind: 'beyond' }
  | { readonly kind: 'not-settled' };

function requireRestriction({ lengthM, nominalBoreM, narrowedLengthM, narrowedBoreM }: RestrictedLine, { systemPressurePa, inletPressurePa, index }: Delivery): void {
  requireWithin('nominalBoreM', 'length', nominalBoreM, { least: ABOVE_ZERO, most: 1 });
  requireNotNegative('lengthM', 'length', lengthM);
  requireWithin('narrowedLengthM', 'length', narrowedLengthM, { least: 0, most: lengthM });
  requireWithin('narrowedBoreM', 'length', narrowedBoreM, { least: ABOVE_ZERO, most: nominalBoreM });
  requireWithin('systemPressurePa', 'absolutePressure', systemPressurePa, { least: inletPressurePa, most: MOST_HEAD_PRESSURE });
  requireWithin('index', 'ratio', index, { least: 1, most: 1.6 });
}

/** The temperature that compression to a head pressure gives. */
export function headTemperature(headPressurePa: AbsolutePressure, { inletTemperatureK, inletPressurePa, index }: Delivery): Temperature {
  return dischargeTemperature({ inletTemperatureK, inletPressurePa, dischargePressurePa: headPressurePa, index });
}

/**
 * The pressure that the head needs to push the delivery through the line, the air having some temperature all along.
 *
 * From the far end: sqrt(p^2 + f (L/d) G2 R T) through the sound part, then the same through the narrowed part. Air
 * cannot leave the narrowed part faster than sound, so that there p is at least G sqrt(R T / k); nor enter it faster, so
 * that the head has at least m sqrt(T) / (C A K).
 *
 * @returns Pa, absolute, and whether a limit by the speed of sound decided it
 */
export function pressureNeeded(headTemperatureK: Temperature, line: RestrictedLine, delivery: Delivery): { pressurePa: AbsolutePressure; choked: boolean } {
  const air = { massFlowKgPerS: massFlowOf(delivery.freeAirFlowM3PerS, delivery.freeAirDensityKgPerM3), airTemperatureK: headTemperatureK };
  const { narrowedBoreM, narrowedLengthM } = line;
  const sound = { lengthM: line.lengthM - narrowedLengthM, boreM: line.nominalBoreM };
  const flux = massFlux(air.massFlowKgPerS, narrowedBoreM);

  const afterNarrowed = upstreamPressure({ ...sound, ...air, downstreamPressurePa: delivery.systemPressurePa });
  const sonicExit = flux * Math.sqrt((GAS_CONSTANT_AIR * headTemperatureK) / HEAT_CAPACITY_RATIO);
  const atHead = upstreamPressure({
    lengthM: narrowedLengthM,
    boreM: narrowedBoreM,
    ...air,
    downstreamPressurePa: absolutePressure(Math.max(afterNarrowed, sonicExit)),
  });
  const sonicEntry = (flux * Math.sqrt(headTemperatureK)) / (ENTRY_COEFFICIENT * criticalFlowConstant());
  return { pressurePa: absolutePressure(Math.max(atHead, sonicEntry)), choked: sonicExit > afterNarrowed || sonicEntry > atHead };
}

/**
 * Pressure and temperature in the head of a compressor that delivers through a line with less than its bore: the more
 * pressure, the hotter the air; the hotter the air, the more pressure the line takes.
 *
 * Solves  p = pressureNeeded(headTemperature(p))  by repeated substitution. Temperature moves the needed pressure by
 * less than half as much as pressure moves temperature, so that each step shrinks the error.
 *
 * Steady flow: a piston sends its air in pulses, and the peaks are higher. Delivery is held: a real compressor delivers
 * less against a higher head. The line is as hot as the head all along: a real one cools, which overstates the loss of
 * the part that has its bore.
 *
 * @throws OutOfRange
 * @example
 * // 10 ft of 5/8 in, 1/8 in left over 6 ft, 12 cfm at 120 psig
 * headPressure(line, delivery) // { kind: 'settled', ... }
 */
export function headPressure(line: RestrictedLine, delivery: Delivery): HeadPressure {
  requireRestriction(line, delivery);
  const needed = (pressurePa: number) => pressureNeeded(headTemperature(absolutePressure(pressurePa), delivery), line, delivery);
  if (needed(MOST_HEAD_PRESSURE).pressurePa > MOST_HEAD_PRESSURE) return { kind: 'beyond' };

  const found = fixedPoint((pressurePa) => Math.min(needed(pressurePa).pressurePa, MOST_HEAD_PRESSURE), { from: delivery.systemPressurePa });
  if (!found.converged) return { kind: 'not-settled' };
  const headPressurePa = absolutePressure(found.value);
  const headTemperatureK = headTemperature(headPressurePa, delivery);
  return {
    kind: 'settled',
    headPressurePa,
    headTemperatureK,
    lossPa: headPressurePa - delivery.systemPressurePa,
    choked: needed(headPressurePa).choked,
    frictionFactor: lineFrictionFactor({
      boreM: line.narrowedBoreM,
      massFlowKgPerS: massFlowOf(delivery.freeAirFlowM3PerS, delivery.freeAirDensityKgPerM3),
      airTemperatureK: headTemperatureK,
    }),
    iterations: found.iterations,
  };
}

/** The bore at which the head comes to a pressure, or which side of it every bore lies. */
export type BoreForHeadPressure =
  | { readonly kind: 'bore'; readonly boreM: number }
  /** With its full bore the line takes the head past this pressure. */
  | { readonly kind: 'always-above' }
  /** Nothing flows, or no part is narrowed: the head never comes to it. */
  | { readonly kind: 'never' }
  | { readonly kind: 'not-settled' };

/** Smaller than any passage that still passes air, m. */
const LEAST_BORE = 1e-5;

/**
 * The bore left in the narrowed part at which the head would come to a pressure: 150 psi, or the 250 psi at which its
 * safety valve opens.
 *
 * @param limitPressurePa Pa, absolute
 * @throws OutOfRange
 * @example boreForHeadPressure(line, delivery, toAbsolute(gaugePressure(1_034_214)))
 */
export function boreForHeadPressure(line: Omit<RestrictedLine, 'narrowedBoreM'>, delivery: Delivery, limitPressurePa: AbsolutePressure): BoreForHeadPressure {
  requireRestriction({ ...line, narrowedBoreM: line.nominalBoreM }, delivery);
  requireWithin('limitPressurePa', 'absolutePressure', limitPressurePa, { least: delivery.systemPressurePa, most: MOST_HEAD_PRESSURE });
  const temperatureAtLimit = headTemperature(limitPressurePa, delivery);
  const short = (logBore: number) =>
    Math.log(pressureNeeded(temperatureAtLimit, { ...line, narrowedBoreM: Math.exp(logBore) }, delivery).pressurePa / limitPressurePa);
  const [from, to] = [Math.log(Math.min(LEAST_BORE, line.nominalBoreM / 2)), Math.log(line.nominalBoreM)];
  if (short(to) > 0) return { kind: 'always-above' };
  if (short(from) < 0) return { kind: 'never' };
  const found = findRoot(short, { from, to, relative: 1e-14 });
  return found.converged ? { kind: 'bore', boreM: Math.exp(found.root) } : { kind: 'not-settled' };
}
