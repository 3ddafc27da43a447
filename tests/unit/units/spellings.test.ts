import { describe, expect, it } from 'vitest';
import { parseQuantity, toSi, type Quantity, type UnitId } from '@/lib/units';

/** What people write for a quantity, beside a default unit: what it is, or a part of the sentence that refuses it. */
interface Spellings {
  readonly defaultUnit: UnitId;
  readonly accepted: readonly (readonly [text: string, value: number, unit: UnitId])[];
  readonly refused: readonly (readonly [text: string, because: RegExp])[];
}

const SPELLINGS: { readonly [Q in Quantity]?: Spellings } = {
  pressure: {
    defaultUnit: 'kPa',
    accepted: [
      ['120 psi', 120, 'psi'], ['120 PSI', 120, 'psi'], ['120psig', 120, 'psi'], ['120 psi gauge', 120, 'psi'], ['120 lb/in²', 120, 'psi'], ['120 lbs. per sq. in.', 120, 'psi'],
      ['120 pounds', 120, 'psi'], ['8.3 bar', 8.3, 'bar'], ['8,3 Bar', 8.3, 'bar'], ['8.3 bars', 8.3, 'bar'], ['830 kPa', 830, 'kPa'], ['830 KPA', 830, 'kPa'], ['830', 830, 'kPa'],
      ['0.83 MPa', 0.83, 'MPa'], ['830 kilopascals', 830, 'kPa'], ['8,5 kg/cm2', 8.5, 'kgf/cm2'], ['8.5 kgf/cm²', 8.5, 'kgf/cm2'], ['4 inH2O', 4, 'inH2O'], ['4 inches of water', 4, 'inH2O'],
      ['2 in. Hg', 2, 'inHg'], ['1013 hPa', 1013, 'mbar'], ['-3 psi', -3, 'psi'], ['.5 psi', 0.5, 'psi'],
    ],
    refused: [
      ['120 psia', /Absolute pressure is not taken here/], ['8 bar abs', /Absolute pressure is not taken here/], ['120 psi/min', /pressure change over time/], ['120 F', /is a unit of temperature/],
      ['about 120', /not a pressure that we know/], ['120-130 psi', /not a pressure/], ['-120 psi', /perfect vacuum/], ['', /^Type a pressure/], ['psi', /not a pressure/], ['1.2.3 bar', /not a pressure/],
    ],
  },
  absolutePressure: {
    defaultUnit: 'psia',
    accepted: [
      ['14.7', 14.7, 'psia'], ['14.7 psia', 14.7, 'psia'], ['14.7 PSI abs', 14.7, 'psia'], ['14.7 psi absolute', 14.7, 'psia'], ['101,3 kPa abs', 101.3, 'kPa abs'], ['101 kPaa', 101, 'kPa abs'],
      ['1.013 bara', 1.013, 'bar abs'], ['1 bar absolute', 1, 'bar abs'], ['29.9 inHg abs', 29.9, 'inHg abs'], ['1013 mbara', 1013, 'mbar abs'], ['1 atm', 1, 'atm'], ['1 ata', 1, 'kgf/cm2 abs'],
    ],
    refused: [
      ['120 psi', /counts from a perfect vacuum/], ['8 bar', /write it as 14.7 psia/], ['830 kPa', /counts from a perfect vacuum/], ['120 psig', /counts from a perfect vacuum/],
      ['-1 psia', /cannot be less than zero/], ['14.7 mm', /is a unit of length/], ['one atmosphere', /not an absolute pressure that we know/],
    ],
  },
  pressureRate: {
    defaultUnit: 'psi/min',
    accepted: [['2', 2, 'psi/min'], ['2 psi/min', 2, 'psi/min'], ['2 psi per minute', 2, 'psi/min'], ['2 lbs/min', 2, 'psi/min'], ['14 kPa/min', 14, 'kPa/min'], ['0,2 bar/min', 0.2, 'bar/min'], ['1 psi/sec', 1, 'psi/s']],
    refused: [['2 psi', /is a unit of pressure/], ['-2 psi/min', /without a minus sign/], ['2 psi/h', /not a pressure change over time/]],
  },
  temperature: {
    defaultUnit: 'degF',
    accepted: [
      ['250', 250, 'degF'], ['250 F', 250, 'degF'], ['250°F', 250, 'degF'], ['250 deg. F', 250, 'degF'], ['250 degrees Fahrenheit', 250, 'degF'], ['120 C', 120, 'degC'], ['120 ºC', 120, 'degC'],
      ['120 celsius', 120, 'degC'], ['120 centigrade', 120, 'degC'], ['-40 F', -40, 'degF'], ['−40', -40, 'degF'], ['393 K', 393, 'K'],
    ],
    refused: [['-500 F', /Nothing is colder/], ['-300 C', /Nothing is colder/], ['120 psi', /is a unit of pressure/], ['250 R', /not a temperature that we know/], ['hot', /not a temperature/], ['250 F or so', /not a temperature/]],
  },
  temperatureDifference: {
    defaultUnit: 'degC',
    accepted: [['20', 20, 'degC'], ['20 F', 20, 'degF'], ['-5 K', -5, 'K'], ['11 °C', 11, 'degC']],
    refused: [['20 mm', /is a unit of length/], ['warmer', /not a temperature difference/]],
  },
  length: {
    defaultUnit: 'in',
    accepted: [
      ['5/8', 0.625, 'in'], ['5/8"', 0.625, 'in'], ['5/8 inch', 0.625, 'in'], ['1 3/8 in.', 1.375, 'in'], ['1-3/8', 1.375, 'in'], ['⅝', 0.625, 'in'], ['16 mm', 16, 'mm'], ['16mm', 16, 'mm'], ['1,6 cm', 1.6, 'cm'],
      ['3.6 metres', 3.6, 'm'], ["12'", 12, 'ft'], ['12 ft', 12, 'ft'], ['12 feet', 12, 'ft'], ['5 ft 6 in', 66, 'in'], ['.375', 0.375, 'in'],
    ],
    refused: [
      ['1/0', /divides by zero/], ['1 9/8 in', /fraction that is not less than one/], ['1,375', /can be read as 1375 or as 1.375/], ['-3 mm', /cannot be less than zero/], ['5 ft 14 in', /not a length/],
      ['12 in3', /is a unit of volume/], ['12 furlongs', /not a length that we know/], ['3 by 4 mm', /not a length/],
    ],
  },
  area: {
    defaultUnit: 'mm2',
    accepted: [['200', 200, 'mm2'], ['200 sq. mm', 200, 'mm2'], ['2 cm²', 2, 'cm2'], ['0.3 sq in', 0.3, 'in2'], ['0.3 square inches', 0.3, 'in2']],
    refused: [['200 mm', /is a unit of length/], ['-1', /cannot be less than zero/]],
  },
  volume: {
    defaultUnit: 'mL',
    accepted: [
      ['30', 30, 'mL'], ['30 cc', 30, 'mL'], ['30 millilitres', 30, 'mL'], ['1.5 L', 1.5, 'L'], ['1,5 liters', 1.5, 'L'], ['1 fl. oz.', 1, 'floz'], ['1 ounce', 1, 'floz'], ['2 pints', 2, 'pt'], ['1 qt', 1, 'qt'],
      ['2 gallons', 2, 'gal'], ['4500 cu. in.', 4500, 'in3'], ['4500 in³', 4500, 'in3'], ['3 cu ft', 3, 'ft3'], ['3 cubic feet', 3, 'ft3'],
    ],
    refused: [['4,500 in3', /can be read as 4500 or as 4.5/], ['30 g', /is a unit of mass/], ['a cup', /not a volume/], ['-1 mL', /cannot be less than zero/]],
  },
  displacement: {
    defaultUnit: 'cm3',
    accepted: [['318', 318, 'cm3'], ['318 cc', 318, 'cm3'], ['16.5 cu in', 16.5, 'in3'], ['16.5 CID', 16.5, 'in3'], ['0.3 L', 0.3, 'L']],
    refused: [['16.5 in', /is a unit of length/], ['-1 cc', /cannot be less than zero/]],
  },
  mass: {
    defaultUnit: 'g',
    accepted: [['45', 45, 'g'], ['45 grams', 45, 'g'], ['1.6 oz', 1.6, 'oz'], ['0,05 kg', 0.05, 'kg'], ['1 lb 4 oz', 20, 'oz'], ['2 lbs', 2, 'lb']],
    refused: [['45 mL', /is a unit of volume/], ['-45 g', /cannot be less than zero/]],
  },
  density: {
    defaultUnit: 'g/mL',
    accepted: [
      ['0.87', 0.87, 'g/mL'], ['0,87 g/ml', 0.87, 'g/mL'], ['0.87 g/cc', 0.87, 'g/mL'], ['0.87 g/cm³', 0.87, 'g/mL'], ['870 kg/m3', 870, 'kg/m3'], ['0.87 kg/L', 0.87, 'kg/L'], ['54 lb/ft3', 54, 'lb/ft3'],
      ['54 lbs/cu ft', 54, 'lb/ft3'], ['7.3 lb/gal', 7.3, 'lb/gal'], ['870 kilograms per cubic metre', 870, 'kg/m3'],
    ],
    refused: [['0.87 g', /is a unit of mass/], ['-1', /cannot be less than zero/], ['30 API', /not a density that we know/]],
  },
  kinematicViscosity: {
    defaultUnit: 'cSt',
    accepted: [['14.8', 14.8, 'cSt'], ['14.8 cSt', 14.8, 'cSt'], ['14,8 CST', 14.8, 'cSt'], ['110 mm²/s', 110, 'mm2/s'], ['110 mm2/s', 110, 'mm2/s'], ['110 centistokes', 110, 'cSt'], ['1.1 St', 1.1, 'St']],
    refused: [['14.8 cP', /is a unit of dynamic viscosity/], ['15W-40', /not a kinematic viscosity/], ['70 SUS', /not a kinematic viscosity that we know/], ['-1 cSt', /cannot be less than zero/]],
  },
  dynamicViscosity: {
    defaultUnit: 'mPas',
    accepted: [['7000', 7000, 'mPas'], ['7000 mPa·s', 7000, 'mPas'], ['7000 mPa s', 7000, 'mPas'], ['3.7 cP', 3.7, 'cP'], ['18.1 µPa·s', 18.1, 'uPas'], ['0.1 Pa s', 0.1, 'Pas'], ['3,5 centipoise', 3.5, 'cP']],
    refused: [['14.8 cSt', /is a unit of kinematic viscosity/], ['-1', /cannot be less than zero/]],
  },
  concentration: {
    defaultUnit: 'mg/m3',
    accepted: [['5', 5, 'mg/m3'], ['5 mg/m³', 5, 'mg/m3'], ['5 milligrams per cubic meter', 5, 'mg/m3'], ['0,9 g/m3', 0.9, 'g/m3']],
    refused: [['5 ppm', /not an oil content that we know/], ['5 kg/m3', /is a unit of density/], ['-5', /cannot be less than zero/]],
  },
  power: {
    defaultUnit: 'hp',
    accepted: [['5', 5, 'hp'], ['5 HP', 5, 'hp'], ['5 h.p.', 5, 'hp'], ['5 bhp', 5, 'hp'], ['3.7 kW', 3.7, 'kW'], ['3,7 kilowatts', 3.7, 'kW'], ['3700 W', 3700, 'W'], ['5 PS', 5, 'PS']],
    refused: [['5 psi', /is a unit of pressure/], ['-5 hp', /cannot be less than zero/], ['five hp', /not a power/]],
  },
  angle: {
    defaultUnit: 'deg',
    accepted: [['10', 10, 'deg'], ['10°', 10, 'deg'], ['10 deg', 10, 'deg'], ['10 degrees', 10, 'deg'], ['0.17 rad', 0.17, 'rad']],
    refused: [['10 %', /is a unit of ratio/], ['-10', /without a minus sign/]],
  },
  flow: {
    defaultUnit: 'cfm',
    accepted: [
      ['12', 12, 'cfm'], ['12 cfm', 12, 'cfm'], ['12 CFM', 12, 'cfm'], ['12 ft3/min', 12, 'cfm'], ['12 cu. ft. per minute', 12, 'cfm'], ['340 L/min', 340, 'L/min'], ['340 lpm', 340, 'L/min'], ['5,7 l/s', 5.7, 'L/s'],
      ['500 mL/min', 500, 'mL/min'], ['2 gpm', 2, 'gal/min'],
    ],
    refused: [['12 ft3', /is a unit of volume/], ['-12', /cannot be less than zero/], ['12 cfm at 90 psi', /not a flow/]],
  },
  oilRate: {
    defaultUnit: 'mL/h',
    accepted: [['1.5', 1.5, 'mL/h'], ['1,5 ml/hr', 1.5, 'mL/h'], ['1.5 cc per hour', 1.5, 'mL/h'], ['0.05 fl oz/h', 0.05, 'floz/h']],
    refused: [['1.5 mL', /is a unit of volume/], ['-1', /cannot be less than zero/]],
  },
  duration: {
    defaultUnit: 's',
    accepted: [['48', 48, 's'], ['48 sec', 48, 's'], ['1:30', 90, 's'], ['1 min 30 s', 90, 's'], ['1,5 min', 1.5, 'min'], ['2 hours', 2, 'h'], ['3 days', 3, 'd']],
    refused: [['1:75', /60 or more after a colon/], ['30 s 1 min', /not a length of time/], ['-5 s', /cannot be less than zero/], ['a while', /not a length of time/]],
  },
  engineHours: { defaultUnit: 'h', accepted: [['12,400', 12_400, 'h'], ['12 400 hrs', 12_400, 'h']], refused: [['12400 mi', /is a unit of distance/]] },
  distance: { defaultUnit: 'mi', accepted: [['410,000', 410_000, 'mi'], ['660 000 km', 660_000, 'km']], refused: [['410k', /Write the thousands out/], ['410.000', /can be read as 410000 or as 410/]] },
  cycleRate: { defaultUnit: 'per h', accepted: [['6', 6, 'per h'], ['6 times per hour', 6, 'per h'], ['0.5/min', 0.5, 'per min']], refused: [['-6', /cannot be less than zero/]] },
  rotationalSpeed: { defaultUnit: 'rpm', accepted: [['1,000', 1000, 'rpm'], ['1000 r/min', 1000, 'rpm'], ['16.7 rev/s', 16.7, 'r/s']], refused: [['1000 Hz', /not a rotational speed/], ['-1', /cannot be less than zero/]] },
  ratio: { defaultUnit: 'percent', accepted: [['25', 25, 'percent'], ['25 pct', 25, 'percent'], ['1/4', 0.25, 'one'], ['1.5:1', 1.5, 'one']], refused: [['1:0', /divides by zero/], ['-25 %', /cannot be less than zero/]] },
  count: { defaultUnit: 'one', accepted: [['2', 2, 'one'], ['1,200', 1200, 'one']], refused: [['2.5', /not a whole number/], ['-2', /cannot be less than zero/]] },
  vacuum: { defaultUnit: 'inH2O', accepted: [['25', 25, 'inH2O'], ['25" H2O', 25, 'inH2O'], ['6.2 kPa', 6.2, 'kPa']], refused: [['-25', /without a minus sign/], ['40 inHg', /perfect vacuum/]] },
};

const ROWS = Object.entries(SPELLINGS) as [Quantity, Spellings][];

it('is more than 200 spellings, of every quantity that a person types', () => {
  expect(ROWS.flatMap(([, { accepted, refused }]) => [...accepted, ...refused]).length).toBeGreaterThanOrEqual(200);
  for (const [, { accepted, refused }] of ROWS) expect(Math.min(accepted.length, refused.length)).toBeGreaterThan(0);
});

describe.each(ROWS)('%s', (quantity, { defaultUnit, accepted, refused }) => {
  it.each(accepted)('%s is %d %s', (text, value, unit) => {
    const parsed = parseQuantity<Quantity>(text, { quantity, defaultUnit });
    expect(parsed).toMatchObject({ ok: true, unit });
    if (parsed.ok) {
      expect(parsed.value).toBeCloseTo(value, 12);
      expect(parsed.si).toBeCloseTo(toSi<Quantity>(value, quantity, unit), 9);
    }
  });

  it.each(refused)('%j is refused in a clear sentence: %s', (text, because) => {
    const parsed = parseQuantity<Quantity>(text, { quantity, defaultUnit });
    expect(parsed).toMatchObject({ ok: false, message: expect.stringMatching(because) });
    if (!parsed.ok) expect(parsed.message).toMatch(/^['A-Z].*[.]$/s);
  });
});
