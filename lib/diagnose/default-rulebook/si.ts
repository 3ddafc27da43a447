/** What people in the trade say, in SI: the bands, ranges and errors of the default rulebook are written with these. */

const INCH = 0.0254;
const POUND_FORCE = 0.45359237 * 9.80665;
const PSI = POUND_FORCE / INCH ** 2;
/** Conventional inch of water: 1000 kg/m3 at standard gravity. */
const INCH_OF_WATER = 1000 * 9.80665 * INCH;
const MILE = 1609.344;
const MINUTE = 60;
const HOUR = 3600;
const DAY = 86_400;
const YEAR = 365.25 * DAY;
const MILLILITRE = 1e-6;
const CELSIUS_OFFSET = 273.15;

/** Pa */
export const psi = (value: number): number => value * PSI;
/** Pa/s */
export const psiPerMinute = (value: number): number => (value * PSI) / MINUTE;
/** Pa; a vacuum counts downwards from the air around */
export const inH2O = (value: number): number => value * INCH_OF_WATER;
/** m */
export const mm = (value: number): number => value / 1000;
/** m */
export const miles = (value: number): number => value * MILE;
/** s */
export const seconds = (value: number): number => value;
/** s */
export const minutes = (value: number): number => value * MINUTE;
/** s */
export const days = (value: number): number => value * DAY;
/** s */
export const hours = (value: number): number => value * HOUR;
/** s */
export const years = (value: number): number => value * YEAR;
/** K, a point on the scale */
export const celsius = (value: number): number => value + CELSIUS_OFFSET;
/** K, a difference between two points */
export const kelvins = (value: number): number => value;
/** m3/s */
export const millilitresPerHour = (value: number): number => (value * MILLILITRE) / HOUR;
/** m3 */
export const millilitres = (value: number): number => value * MILLILITRE;
/** 1/s */
export const perHour = (value: number): number => value / HOUR;
/** A share of one. */
export const percent = (value: number): number => value / 100;
