import { notNegative, unit, type QuantityDefinition } from '../definition';
import {
  CUBIC_FOOT,
  DEGREE,
  HORSEPOWER,
  INCH_OF_MERCURY,
  KGF_PER_CM2,
  METRIC_HORSEPOWER,
  POUND,
  PSI,
  STANDARD_ATMOSPHERE,
  US_GALLON,
} from '../factors';

const GAUGE = 'An absolute pressure counts from a perfect vacuum; write it as 14.7 psia or 101 kPa abs.';

/** Pressure above a perfect vacuum, as barometers read and as the gas laws need it. Never written like a gauge pressure. */
export const absolutePressure = {
  noun: 'absolute pressure',
  called: 'an absolute pressure',
  siUnit: 'Pa (absolute)',
  units: {
    psia: unit('psia', 'pounds per square inch, absolute', PSI, { digits: 2, spellings: ['psi abs', 'psi absolute', 'lb/in2 abs', 'psi a'] }),
    'kPa abs': unit('kPa abs', 'kilopascals, absolute', 1000, { digits: 1, spellings: ['kPaa', 'kPa absolute', 'kPa (abs)'] }),
    'bar abs': unit('bar abs', 'bar, absolute', 1e5, { digits: 3, spellings: ['bara', 'bar absolute', 'bar (abs)'] }),
    'mbar abs': unit('mbar abs', 'millibar, absolute', 100, { spellings: ['mbara', 'mbar absolute', 'hPa abs', 'hPaa'] }),
    'inHg abs': unit('inHg abs', 'inches of mercury, absolute', INCH_OF_MERCURY, { digits: 2, spellings: ['in hg abs', 'inHga', 'inches of mercury absolute'] }),
    'kgf/cm2 abs': unit('kgf/cm² abs', 'kilograms-force per square centimetre, absolute', KGF_PER_CM2, { digits: 3, spellings: ['ata', 'kg/cm2 abs'] }),
    atm: unit('atm', 'standard atmospheres', STANDARD_ATMOSPHERE, { digits: 3, spellings: ['atmosphere', 'atmospheres', 'standard atmosphere'] }),
  },
  examples: ['14.7 psia', '101 kPa abs'],
  min: notNegative('An absolute pressure cannot be less than zero, a perfect vacuum.'),
  hints: { psi: GAUGE, kPa: GAUGE, bar: GAUGE, mbar: GAUGE, hPa: GAUGE, psig: GAUGE, barg: GAUGE, kPag: GAUGE, inHg: GAUGE },
} satisfies QuantityDefinition;

/** How thick an oil is as it runs down by its own weight: what an oil's data sheet states at 40 and 100 °C. */
export const kinematicViscosity = {
  noun: 'kinematic viscosity',
  called: 'a kinematic viscosity',
  siUnit: 'm2/s',
  units: {
    cSt: unit('cSt', 'centistokes', 1e-6, { digits: 1, spellings: ['centistoke', 'c st', 'csts'] }),
    'mm2/s': unit('mm²/s', 'square millimetres per second', 1e-6, { digits: 1, spellings: ['mm2/sec', 'sq mm/s', 'square millimeters per second'] }),
    St: unit('St', 'stokes', 1e-4, { digits: 3, spellings: ['stoke'] }),
  },
  examples: ['14.8 cSt', '110 mm2/s'],
  min: notNegative('A viscosity cannot be less than zero.'),
} satisfies QuantityDefinition;

/** How hard a fluid is to shear: cranking and high-shear limits of engine oils, and the viscosity of air. */
export const dynamicViscosity = {
  noun: 'dynamic viscosity',
  called: 'a dynamic viscosity',
  siUnit: 'Pa s',
  units: {
    mPas: unit('mPa·s', 'millipascal seconds', 1e-3, { digits: 1, spellings: ['mPa s', 'millipascal second'] }),
    cP: unit('cP', 'centipoise', 1e-3, { digits: 1, spellings: ['cps', 'centipoises'] }),
    uPas: unit('µPa·s', 'micropascal seconds', 1e-6, { digits: 1, spellings: ['uPa s', 'micropascal second'] }),
    Pas: unit('Pa·s', 'pascal seconds', 1, { digits: 3, spellings: ['Pa s', 'pascal second'] }),
  },
  examples: ['3.7 mPa s', '7000 cP'],
  min: notNegative('A viscosity cannot be less than zero.'),
} satisfies QuantityDefinition;

/** Mass in a volume: oil, to turn what was weighed into millilitres. */
export const density = {
  noun: 'density',
  called: 'a density',
  siUnit: 'kg/m3',
  units: {
    'g/mL': unit('g/mL', 'grams per millilitre', 1000, { digits: 3, spellings: ['g/ml', 'g/cc', 'g/cm3', 'grams per milliliter'] }),
    'kg/m3': unit('kg/m³', 'kilograms per cubic metre', 1, { digits: 1, spellings: ['kg/cu m', 'kilograms per cubic meter'] }),
    'kg/L': unit('kg/L', 'kilograms per litre', 1000, { digits: 3, spellings: ['kg/l', 'kilograms per liter'] }),
    'lb/ft3': unit('lb/ft³', 'pounds per cubic foot', POUND / CUBIC_FOOT, { digits: 2, spellings: ['lb/cu ft', 'lbs/ft3', 'lbs/cu ft'] }),
    'lb/gal': unit('lb/gal', 'pounds per gallon', POUND / US_GALLON, { digits: 2, spellings: ['lbs/gal', 'lb/us gal', 'pounds per us gallon'] }),
  },
  examples: ['0.87 g/mL', '870 kg/m3'],
  min: notNegative('A density cannot be less than zero.'),
} satisfies QuantityDefinition;

/** Oil carried in air, by the volume of that air in its free state. */
export const concentration = {
  noun: 'oil content of air',
  called: 'an oil content',
  siUnit: 'kg/m3',
  units: {
    'mg/m3': unit('mg/m³', 'milligrams per cubic metre', 1e-6, { digits: 1, spellings: ['mg/cu m', 'milligrams per cubic meter', 'mg/m3 free air'] }),
    'g/m3': unit('g/m³', 'grams per cubic metre', 1e-3, { digits: 3, spellings: ['g/cu m', 'grams per cubic meter'] }),
  },
  examples: ['5 mg/m3', '0.9 g/m3'],
  min: notNegative('An oil content cannot be less than zero.'),
} satisfies QuantityDefinition;

/** What the engine spends on driving the compressor. */
export const power = {
  noun: 'power',
  called: 'a power',
  siUnit: 'W',
  units: {
    hp: unit('hp', 'horsepower', HORSEPOWER, { digits: 1, spellings: ['bhp', 'horse power', 'h.p.'] }),
    kW: unit('kW', 'kilowatts', 1000, { digits: 2, spellings: ['kilowatt', 'kws'] }),
    W: unit('W', 'watts', 1, { spellings: ['watt'] }),
    PS: unit('PS', 'metric horsepower', METRIC_HORSEPOWER, { digits: 1, spellings: ['metric hp', 'cv'] }),
  },
  examples: ['5 hp', '3.7 kW'],
  min: notNegative('A power cannot be less than zero.'),
} satisfies QuantityDefinition;

/** How steeply something falls, from the level. */
export const angle = {
  noun: 'angle',
  called: 'an angle',
  siUnit: 'rad',
  units: {
    deg: unit('deg', 'degrees', DEGREE, { digits: 1, spellings: ['degree', 'degs'] }),
    rad: unit('rad', 'radians', 1, { digits: 3, spellings: ['radian'] }),
  },
  examples: ['10 deg', '90 deg'],
  min: notNegative('Type an angle without a minus sign.'),
} satisfies QuantityDefinition;
