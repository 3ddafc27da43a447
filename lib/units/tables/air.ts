import { notNegative, per, unit, type QuantityDefinition } from '../definition';
import {
  CELSIUS_OFFSET,
  FAHRENHEIT_OFFSET,
  INCH_OF_MERCURY,
  INCH_OF_WATER,
  KGF_PER_CM2,
  MILLIMETRE_OF_WATER,
  MINUTE,
  PSI,
  STANDARD_ATMOSPHERE,
} from '../factors';
import { MINUTES, SECONDS } from './time';

const PSIS = ['psi', 'psig', 'psi gauge', 'lb/in2', 'lbs/in2', 'lbf/in2', 'lb/sq in', 'lbs/sq in', 'pounds', 'pound', 'lb', 'lbs'];
const KPAS = ['kPa', 'kPag', 'kilopascal', 'kilopascals'];
const BARS = ['bar', 'bars', 'barg'];
const INCHES_OF_WATER = ['in h2o', 'inches h2o', 'inch h2o', 'inches of water', 'inch of water', '"h2o', '" wc', '" wg', 'in wc', 'in wg', 'in water', 'inches wc'];
const INCHES_OF_MERCURY = ['in hg', 'inches hg', 'inch hg', 'inches of mercury', 'inch of mercury', '"hg'];
const MILLIBARS = ['mbar', 'millibar', 'millibars', 'hPa'];

const ABSOLUTE = 'Absolute pressure is not taken here. Type what the gauge shows, such as 120 psi.';
const PERFECT_VACUUM = 'cannot go past a perfect vacuum, 14.7 psi (101 kPa) below the air around.';

/**
 * Gauge pressure: above the air around, as a truck's gauges read, with zero at an open tank. Absolute pressure is a
 * different thing and is refused by name ("psia") rather than mixed in.
 */
export const pressure = {
  noun: 'pressure',
  called: 'a pressure',
  siUnit: 'Pa (gauge)',
  units: {
    psi: unit('psi', 'pounds per square inch', PSI, { digits: 1, spellings: PSIS }),
    kPa: unit('kPa', 'kilopascals', 1000, { spellings: KPAS }),
    bar: unit('bar', 'bar', 1e5, { digits: 2, spellings: BARS }),
    mbar: unit('mbar', 'millibar', 100, { spellings: MILLIBARS }),
    MPa: unit('MPa', 'megapascals', 1e6, { digits: 3, spellings: ['megapascal'] }),
    Pa: unit('Pa', 'pascals', 1, { spellings: ['pascal'] }),
    'kgf/cm2': unit('kgf/cm²', 'kilograms-force per square centimetre', KGF_PER_CM2, { digits: 2, spellings: ['kg/cm2', 'kgf/cm2'] }),
    inH2O: unit('inH2O', 'inches of water', INCH_OF_WATER, { digits: 1, spellings: INCHES_OF_WATER }),
    inHg: unit('inHg', 'inches of mercury', INCH_OF_MERCURY, { digits: 1, spellings: INCHES_OF_MERCURY }),
  },
  examples: ['120 psi', '8.3 bar'],
  min: { si: -STANDARD_ATMOSPHERE, message: `A gauge pressure ${PERFECT_VACUUM}` },
  hints: { psia: ABSOLUTE, 'psi abs': ABSOLUTE, bara: ABSOLUTE, 'bar abs': ABSOLUTE, kpaa: ABSOLUTE, 'kpa abs': ABSOLUTE },
} satisfies QuantityDefinition;

/** How fast pressure builds or leaks: the size of the change, never signed. */
export const pressureRate = {
  noun: 'pressure change over time',
  called: 'a pressure change over time',
  siUnit: 'Pa/s',
  units: {
    'psi/min': unit('psi/min', 'psi per minute', PSI / MINUTE, { digits: 1, spellings: per(PSIS, MINUTES) }),
    'kPa/min': unit('kPa/min', 'kilopascals per minute', 1000 / MINUTE, { digits: 1, spellings: per(KPAS, MINUTES) }),
    'bar/min': unit('bar/min', 'bar per minute', 1e5 / MINUTE, { digits: 2, spellings: per(BARS, MINUTES) }),
    'psi/s': unit('psi/s', 'psi per second', PSI, { digits: 2, spellings: per(PSIS, SECONDS) }),
    'kPa/s': unit('kPa/s', 'kilopascals per second', 1000, { digits: 1, spellings: per(KPAS, SECONDS) }),
  },
  examples: ['3 psi/min', '20 kPa/min'],
  min: notNegative('Type how large the change is, without a minus sign.'),
} satisfies QuantityDefinition;

/** Suction: how far below the air around. Positive; boost is a pressure. */
export const vacuum = {
  noun: 'vacuum',
  called: 'a vacuum',
  siUnit: 'Pa below atmosphere',
  units: {
    inH2O: unit('inH2O', 'inches of water', INCH_OF_WATER, { digits: 1, spellings: INCHES_OF_WATER }),
    kPa: unit('kPa', 'kilopascals', 1000, { digits: 1, spellings: KPAS }),
    mbar: unit('mbar', 'millibar', 100, { spellings: MILLIBARS }),
    inHg: unit('inHg', 'inches of mercury', INCH_OF_MERCURY, { digits: 1, spellings: INCHES_OF_MERCURY }),
    mmH2O: unit('mmH2O', 'millimetres of water', MILLIMETRE_OF_WATER, { spellings: ['mm h2o', 'mm of water', 'mm wc'] }),
    psi: unit('psi', 'pounds per square inch', PSI, { digits: 2, spellings: PSIS }),
  },
  examples: ['25 inH2O', '6.2 kPa'],
  min: notNegative('Type a vacuum without a minus sign; boost is a pressure.'),
  max: { si: STANDARD_ATMOSPHERE, message: `A vacuum ${PERFECT_VACUUM}` },
} satisfies QuantityDefinition;

const FAHRENHEIT = ['F', 'deg F', 'degs F', 'degree F', 'degrees F', 'fahrenheit', 'degree fahrenheit'];
const CELSIUS = ['C', 'deg C', 'degs C', 'degree C', 'degrees C', 'celsius', 'degree celsius', 'centigrade', 'degrees centigrade'];
const KELVIN = ['K', 'kelvins', 'deg K', 'degrees K'];

/** How hot: a point on a scale, so 0 degC and 0 degF are different things. */
export const temperature = {
  noun: 'temperature',
  called: 'a temperature',
  siUnit: 'K',
  units: {
    degF: unit('°F', 'degrees Fahrenheit', 5 / 9, { offset: FAHRENHEIT_OFFSET, spellings: FAHRENHEIT }),
    degC: unit('°C', 'degrees Celsius', 1, { offset: CELSIUS_OFFSET, spellings: CELSIUS }),
    K: unit('K', 'kelvin', 1, { spellings: KELVIN }),
  },
  examples: ['250 F', '120 C'],
  min: { si: 0, message: 'Nothing is colder than -459.67 °F (-273.15 °C).' },
} satisfies QuantityDefinition;

/** How much hotter or colder: a difference, so the scales share their zero. */
export const temperatureDifference = {
  noun: 'temperature difference',
  called: 'a temperature difference',
  siUnit: 'K',
  units: {
    degF: unit('°F', 'degrees Fahrenheit', 5 / 9, { spellings: FAHRENHEIT }),
    degC: unit('°C', 'degrees Celsius', 1, { spellings: CELSIUS }),
    K: unit('K', 'kelvin', 1, { spellings: KELVIN }),
  },
  examples: ['20 F', '11 C'],
} satisfies QuantityDefinition;
