import { GRAVITY } from './air';
import { requirePositive, requireWithin } from './out-of-range';

/** A right angle, and the last bit that a conversion from degrees may add. */
const PLUMB = Math.PI / 2 + 1e-12;

/** Up to this Reynolds number oil runs in layers. */
const LAMINAR_UP_TO = 2000;

interface Pipe {
  readonly boreM: number;
  /** m2/s, kinematic. */
  readonly viscosityM2PerS: number;
}

function requirePipe({ boreM, viscosityM2PerS }: Pipe): void {
  requirePositive('boreM', 'length', boreM);
  requirePositive('viscosityM2PerS', 'kinematicViscosity', viscosityM2PerS);
}

/**
 * Oil running down a full pipe by its own weight, in layers (Hagen and Poiseuille).
 *
 * Q = pi g d4 sin(slope) / (128 nu)
 *
 * @param slopeRad rad from the level, 0 to pi / 2
 * @returns m3/s, and Reynolds' number: past 2000 the formula gives too much
 * @throws OutOfRange
 * @see F. M. White, Fluid Mechanics, chapter 6
 * @example laminarGravityFlow({ boreM: 0.01, slopeRad: Math.PI / 2, viscosityM2PerS: 110e-6 }) // 1.31 L/min, Re 25
 */
export function laminarGravityFlow({ slopeRad, ...pipe }: Pipe & { readonly slopeRad: number }): { flowM3PerS: number; reynolds: number; laminar: boolean } {
  requirePipe(pipe);
  requireWithin('slopeRad', 'angle', slopeRad, { least: 0, most: PLUMB });
  const flowM3PerS = (Math.PI * GRAVITY * pipe.boreM ** 4 * Math.sin(slopeRad)) / (128 * pipe.viscosityM2PerS);
  const reynolds = (4 * flowM3PerS) / (Math.PI * pipe.boreM * pipe.viscosityM2PerS);
  return { flowM3PerS, reynolds, laminar: reynolds <= LAMINAR_UP_TO };
}

/**
 * Liquid running out of a hole under a height of itself (Torricelli): Q = C pi / 4 d2 sqrt(2 g h).
 *
 * @returns m3/s
 * @throws OutOfRange
 * @example orificeGravityFlow({ boreM: 0.01, heightM: 0.02, dischargeCoefficient: 0.6 }) // 2.95e-5: 1.8 L/min
 */
export function orificeGravityFlow({ boreM, heightM, dischargeCoefficient }: { boreM: number; heightM: number; dischargeCoefficient: number }): number {
  requirePositive('boreM', 'length', boreM);
  requireWithin('heightM', 'length', heightM, { least: 0, most: 100 });
  requireWithin('dischargeCoefficient', 'ratio', dischargeCoefficient, { least: 0.01, most: 1 });
  return dischargeCoefficient * (Math.PI / 4) * boreM ** 2 * Math.sqrt(2 * GRAVITY * heightM);
}

export interface Drain extends Pipe {
  /** m, of the opening, from one side to the other. */
  readonly lengthM: number;
  /** m, from the oil's surface down to where it leaves the opening. */
  readonly heightM: number;
  /** 0.6 for a sharp edge. */
  readonly dischargeCoefficient?: number;
}

/** A hole with a sharp edge, for a liquid. */
export const SHARP_EDGED_LIQUID = 0.6;

/**
 * What an opening lets run down by gravity when it is full of oil. The height is spent on drag along the wall and on
 * getting the oil to move:
 *
 * h = 32 nu L v / (g d2) + v2 / (2 g C2),  Q = pi / 4 d2 v
 *
 * so that thick oil in a long opening runs as `laminarGravityFlow` says, and thin oil in a short one as
 * `orificeGravityFlow`; between, the flow is less than either.
 *
 * @returns m3/s; Reynolds' number; whether the wall's drag takes most of the height
 * @throws OutOfRange
 * @see both terms: F. M. White, Fluid Mechanics, chapter 6
 * @example
 * // 6 mm through 20 mm under 30 mm of oil at 12 cSt
 * drainCapacity({ boreM: 0.006, lengthM: 0.02, heightM: 0.03, viscosityM2PerS: 12e-6 }) // 0.59 L/min
 */
export function drainCapacity({ boreM, lengthM, heightM, viscosityM2PerS, dischargeCoefficient = SHARP_EDGED_LIQUID }: Drain): { flowM3PerS: number; reynolds: number; mostlyDrag: boolean } {
  requirePipe({ boreM, viscosityM2PerS });
  requireWithin('lengthM', 'length', lengthM, { least: 0, most: 10 });
  requireWithin('heightM', 'length', heightM, { least: 0, most: 10 });
  requireWithin('dischargeCoefficient', 'ratio', dischargeCoefficient, { least: 0.01, most: 1 });
  const drag = (32 * viscosityM2PerS * lengthM) / (GRAVITY * boreM ** 2);
  const motion = 1 / (2 * GRAVITY * dischargeCoefficient ** 2);
  // The positive root of motion v2 + drag v = h, in the form that loses no digits where drag is large.
  const speed = (2 * heightM) / (drag + Math.sqrt(drag ** 2 + 4 * motion * heightM) || 1);
  return {
    flowM3PerS: (Math.PI / 4) * boreM ** 2 * speed,
    reynolds: (speed * boreM) / viscosityM2PerS,
    mostlyDrag: drag * speed > heightM / 2,
  };
}
