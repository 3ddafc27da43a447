import { notNegative, per, unit, type QuantityDefinition } from '../definition';
import { CUBIC_FOOT, CUBIC_INCH, FOOT, HOUR, INCH, MILE, MINUTE, POUND, US_FLUID_OUNCE, US_GALLON } from '../factors';
import { HOURS, MINUTES, SECONDS } from './time';

const CUBIC_INCHES = ['in3', 'cu in', 'cubic inch', 'cubic in', 'cu inches', 'ci', 'cid'];
const CUBIC_CENTIMETRES = ['cm3', 'cc', 'ccm', 'cu cm', 'cubic centimetre', 'cubic centimeter', 'cubic centimeters'];
const CUBIC_FEET = ['ft3', 'cu ft', 'cubic foot'];
const FLUID_OUNCES = ['fl oz', 'oz', 'ounce', 'ounces', 'fluid ounce', 'us fl oz', 'floz'];
const MILLILITRES = ['mL', 'millilitre', 'milliliter', 'milliliters', 'mls'];
const LITRES = ['L', 'litre', 'liter', 'liters', 'ltr', 'ltrs', 'lt'];
const GALLONS = ['gal', 'gals', 'gallon', 'gallons', 'us gal'];

/** Bores, strokes, line sizes and line lengths. */
export const length = {
  noun: 'length',
  called: 'a length',
  siUnit: 'm',
  units: {
    mm: unit('mm', 'millimetres', 1e-3, { digits: 2, spellings: ['millimetre', 'millimeter', 'millimeters', 'mms'] }),
    cm: unit('cm', 'centimetres', 1e-2, { digits: 2, spellings: ['centimetre', 'centimeter', 'centimeters'] }),
    m: unit('m', 'metres', 1, { digits: 3, spellings: ['metre', 'meter', 'meters'] }),
    in: unit('in', 'inches', INCH, { digits: 3, spellings: ['inch', '"', 'ins'] }),
    ft: unit('ft', 'feet', FOOT, { digits: 2, spellings: ['foot', "'"] }),
  },
  examples: ['16 mm', '5/8 in'],
  min: notNegative('A length cannot be less than zero.'),
  compound: true,
} satisfies QuantityDefinition;

/** Openings: ports and drain holes. */
export const area = {
  noun: 'area',
  called: 'an area',
  siUnit: 'm2',
  units: {
    mm2: unit('mm²', 'square millimetres', 1e-6, { digits: 1, spellings: ['sq mm', 'square mm', 'square millimeters'] }),
    cm2: unit('cm²', 'square centimetres', 1e-4, { digits: 2, spellings: ['sq cm', 'square cm', 'square centimeters'] }),
    in2: unit('in²', 'square inches', INCH * INCH, { digits: 3, spellings: ['sq in', 'square in', 'square inch', 'sq inches'] }),
  },
  examples: ['200 mm2', '0.3 in2'],
  min: notNegative('An area cannot be less than zero.'),
} satisfies QuantityDefinition;

/** What is caught, drained or held: oil in a cup, a reservoir. Ounces and gallons are the US ones. */
export const volume = {
  noun: 'volume',
  called: 'a volume',
  siUnit: 'm3',
  units: {
    mL: unit('mL', 'millilitres', 1e-6, { digits: 1, spellings: [...MILLILITRES, ...CUBIC_CENTIMETRES] }),
    L: unit('L', 'litres', 1e-3, { digits: 2, spellings: LITRES }),
    floz: unit('fl oz', 'fluid ounces', US_FLUID_OUNCE, { digits: 2, spellings: FLUID_OUNCES }),
    pt: unit('pt', 'pints', US_GALLON / 8, { digits: 2, spellings: ['pint', 'pts'] }),
    qt: unit('qt', 'quarts', US_GALLON / 4, { digits: 2, spellings: ['quart', 'qts'] }),
    gal: unit('gal', 'gallons', US_GALLON, { digits: 2, spellings: GALLONS }),
    in3: unit('in³', 'cubic inches', CUBIC_INCH, { digits: 1, spellings: CUBIC_INCHES }),
    ft3: unit('ft³', 'cubic feet', CUBIC_FOOT, { digits: 3, spellings: CUBIC_FEET }),
  },
  examples: ['30 mL', '1 fl oz'],
  min: notNegative('A volume cannot be less than zero.'),
} satisfies QuantityDefinition;

/** The swept volume of a compressor. */
export const displacement = {
  noun: 'displacement',
  called: 'a displacement',
  siUnit: 'm3',
  units: {
    cm3: unit('cm³', 'cubic centimetres', 1e-6, { digits: 1, spellings: [...CUBIC_CENTIMETRES, ...MILLILITRES] }),
    in3: unit('in³', 'cubic inches', CUBIC_INCH, { digits: 2, spellings: CUBIC_INCHES }),
    L: unit('L', 'litres', 1e-3, { digits: 3, spellings: LITRES }),
  },
  examples: ['318 cm3', '19.4 in3'],
  min: notNegative('A displacement cannot be less than zero.'),
} satisfies QuantityDefinition;

/** Catch and weigh. */
export const mass = {
  noun: 'mass',
  called: 'a weight',
  siUnit: 'kg',
  units: {
    g: unit('g', 'grams', 1e-3, { digits: 1, spellings: ['gram', 'gramme', 'grammes', 'gms'] }),
    kg: unit('kg', 'kilograms', 1, { digits: 3, spellings: ['kilogram', 'kilo', 'kilos', 'kgs'] }),
    oz: unit('oz', 'ounces', POUND / 16, { digits: 2, spellings: ['ounce'] }),
    lb: unit('lb', 'pounds', POUND, { digits: 2, spellings: ['lbs', 'pound'] }),
  },
  examples: ['45 g', '1.6 oz'],
  min: notNegative('A weight cannot be less than zero.'),
  compound: true,
} satisfies QuantityDefinition;

/** Air delivered, or liquid running from a drain. */
export const flow = {
  noun: 'flow',
  called: 'a flow',
  siUnit: 'm3/s',
  units: {
    'L/min': unit('L/min', 'litres per minute', 1e-3 / MINUTE, { digits: 1, spellings: [...per(LITRES, MINUTES), 'lpm'] }),
    'mL/min': unit('mL/min', 'millilitres per minute', 1e-6 / MINUTE, { digits: 1, spellings: per([...MILLILITRES, ...CUBIC_CENTIMETRES], MINUTES) }),
    'L/s': unit('L/s', 'litres per second', 1e-3, { digits: 2, spellings: per(LITRES, SECONDS) }),
    cfm: unit('cfm', 'cubic feet per minute', CUBIC_FOOT / MINUTE, { digits: 1, spellings: per(CUBIC_FEET, MINUTES) }),
    'gal/min': unit('gal/min', 'gallons per minute', US_GALLON / MINUTE, { digits: 2, spellings: [...per(GALLONS, MINUTES), 'gpm'] }),
  },
  examples: ['2 L/min', '13 cfm'],
  min: notNegative('A flow cannot be less than zero.'),
} satisfies QuantityDefinition;

/** Oil collected over hours. Apart from flow, because it is a million times smaller and set by its own unit. */
export const oilRate = {
  noun: 'oil collected per hour',
  called: 'an amount of oil per hour',
  siUnit: 'm3/s',
  units: {
    'mL/h': unit('mL/h', 'millilitres per hour', 1e-6 / HOUR, { digits: 2, spellings: per([...MILLILITRES, ...CUBIC_CENTIMETRES], HOURS) }),
    'floz/h': unit('fl oz/h', 'fluid ounces per hour', US_FLUID_OUNCE / HOUR, { digits: 3, spellings: per(FLUID_OUNCES, HOURS) }),
  },
  examples: ['1.5 mL/h', '0.05 fl oz/h'],
  min: notNegative('Oil per hour cannot be less than zero.'),
} satisfies QuantityDefinition;

/** Along the road: odometers and service intervals. */
export const distance = {
  noun: 'distance',
  called: 'a distance',
  siUnit: 'm',
  units: {
    mi: unit('mi', 'miles', MILE, { spellings: ['mile'] }),
    km: unit('km', 'kilometres', 1000, { spellings: ['kilometre', 'kilometer', 'kilometers', 'kms'] }),
  },
  examples: ['410,000 mi', '660,000 km'],
  min: notNegative('A distance cannot be less than zero.'),
  grouped: true,
  hints: { k: 'Write the thousands out, such as 410,000 mi.' },
} satisfies QuantityDefinition;
