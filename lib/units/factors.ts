/**
 * Exact conversion factors to SI. Each is a definition or a product of definitions, so none carries a rounding of its
 * own. Source: NIST Special Publication 811 (2008), appendix B.8, whose printed factors are these to seven digits.
 */

/** Metres in an inch: exact by the international yard and pound agreement of 1959 (NIST SP 811, B.6). */
export const INCH = 0.0254;

/** Metres in a foot: 12 in, exact. */
export const FOOT = 0.3048;

/** Metres in an international mile: 5280 ft, exact. */
export const MILE = 1609.344;

/** Kilograms in an avoirdupois pound: exact. */
export const POUND = 0.45359237;

/** Standard acceleration of free fall in m/s2: exact, the 3rd General Conference on Weights and Measures, 1901. */
export const STANDARD_GRAVITY = 9.80665;

/** Pascals in a pound-force per square inch: 6894.757293168... Pa (SP 811 prints 6.894 757 E+03). */
export const PSI = (POUND * STANDARD_GRAVITY) / (INCH * INCH);

/** Pascals in a kilogram-force per square centimetre: exact. */
export const KGF_PER_CM2 = 98066.5;

/** Pascals in a conventional inch of water (1000 kg/m3, standard gravity): 249.088 91 Pa (SP 811 prints 2.490 889 E+02). */
export const INCH_OF_WATER = 1000 * STANDARD_GRAVITY * INCH;

/** Pascals in a conventional millimetre of water: 9.806 65 Pa. */
export const MILLIMETRE_OF_WATER = STANDARD_GRAVITY;

/** Pascals in a conventional inch of mercury (13 595.1 kg/m3): SP 811 prints 3.386 389 E+03. */
export const INCH_OF_MERCURY = 13595.1 * STANDARD_GRAVITY * INCH;

/** Pascals in a standard atmosphere: exact. The depth of a perfect vacuum, and so the lowest gauge pressure. */
export const STANDARD_ATMOSPHERE = 101325;

/** Cubic metres in a cubic inch: 1.638 706 4 E-05, exact. */
export const CUBIC_INCH = 1.6387064e-5;

/** Cubic metres in a cubic foot: exact. */
export const CUBIC_FOOT = FOOT ** 3;

/** Cubic metres in a US gallon: 231 in3, exact. */
export const US_GALLON = 231 * CUBIC_INCH;

/** Cubic metres in a US fluid ounce: 1/128 US gallon, 29.573 529 562 5 mL, exact. */
export const US_FLUID_OUNCE = US_GALLON / 128;

/** Degrees Fahrenheit from absolute zero to 0 degF: exact. */
export const FAHRENHEIT_OFFSET = 459.67;

/** Degrees Celsius from absolute zero to 0 degC: exact. */
export const CELSIUS_OFFSET = 273.15;

export const MINUTE = 60;
export const HOUR = 3600;
export const DAY = 86_400;

/** Seconds in a year of 365.25 days. Ages are typed in years; no sum depends on which year is meant. */
export const YEAR = 365.25 * DAY;

/** Watts in a horsepower of 550 ft lbf/s: 745.699 87... W (SP 811 prints 7.456 999 E+02). */
export const HORSEPOWER = 550 * FOOT * POUND * STANDARD_GRAVITY;

/** Watts in a metric horsepower of 75 m kgf/s: 735.498 75 W, exact. */
export const METRIC_HORSEPOWER = 75 * STANDARD_GRAVITY;

/** Radians in a degree. */
export const DEGREE = Math.PI / 180;
