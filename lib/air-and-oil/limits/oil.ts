import { toSi } from '@/lib/units';

const cSt = (value: number) => toSi(value, 'kinematicViscosity', 'cSt');
const mPas = (value: number) => toSi(value, 'dynamicViscosity', 'mPas');
const celsius = (value: number) => toSi(value, 'temperature', 'degC');
const mgPerM3 = (value: number) => toSi(value, 'concentration', 'mg/m3');

/** Kinematic viscosity at 100 °C by grade, m2/s: from `least` to below `below`. SAE J300. */
export const J300_AT_100_C = {
  20: { least: cSt(6.9), below: cSt(9.3) },
  30: { least: cSt(9.3), below: cSt(12.5) },
  40: { least: cSt(12.5), below: cSt(16.3) },
  50: { least: cSt(16.3), below: cSt(21.9) },
} as const;

/** Dynamic viscosity at cranking, Pa s at most, at a temperature in K. SAE J300. */
export const J300_CRANKING = {
  '10W': { temperatureK: celsius(-25), most: mPas(7000) },
  '15W': { temperatureK: celsius(-20), most: mPas(7000) },
} as const;

/** Dynamic viscosity at 150 °C and high shear, Pa s at least. SAE J300; that of 10W-40 was 2.9 before (from memory). */
export const J300_HIGH_SHEAR = {
  '30': { least: mPas(2.9) },
  '10W-40': { least: mPas(3.5) },
  '15W-40': { least: mPas(3.7) },
} as const;

/**
 * Total oil in compressed air by purity class, kg/m3 at most; class X is above class 4. Written for plants: a vehicle's
 * air before its dryer is far above all of them, so they classify nothing here but put a figure beside others.
 *
 * @see ISO 8573-1:2010
 */
export const ISO_8573_OIL = { 1: mgPerM3(0.01), 2: mgPerM3(0.1), 3: mgPerM3(1), 4: mgPerM3(5) } as const;
