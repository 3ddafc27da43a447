import { QUANTITY_IDS, isUnitOf, type Quantity, type UnitOf } from './quantities';

/** The unit a person set for each quantity. */
export type UnitPreferences = { readonly [Q in Quantity]: UnitOf<Q> };

/**
 * What a shop in the United States uses. Oil per hour is in millilitres everywhere: ounces would all be small decimals.
 * So are an oil's viscosity and density in the units of its data sheet.
 */
export const US_UNITS: UnitPreferences = {
  pressure: 'psi',
  pressureRate: 'psi/min',
  vacuum: 'inH2O',
  temperature: 'degF',
  temperatureDifference: 'degF',
  length: 'in',
  area: 'in2',
  volume: 'floz',
  displacement: 'in3',
  mass: 'oz',
  flow: 'cfm',
  oilRate: 'mL/h',
  distance: 'mi',
  duration: 's',
  engineHours: 'h',
  cycleRate: 'per h',
  rotationalSpeed: 'rpm',
  ratio: 'percent',
  count: 'one',
  absolutePressure: 'psia',
  kinematicViscosity: 'cSt',
  dynamicViscosity: 'mPas',
  density: 'g/mL',
  concentration: 'mg/m3',
  power: 'hp',
  angle: 'deg',
};

/** What a shop nearly everywhere else uses. */
export const METRIC_UNITS: UnitPreferences = {
  ...US_UNITS,
  pressure: 'kPa',
  pressureRate: 'kPa/min',
  vacuum: 'kPa',
  temperature: 'degC',
  temperatureDifference: 'degC',
  length: 'mm',
  area: 'mm2',
  volume: 'mL',
  displacement: 'cm3',
  mass: 'g',
  flow: 'L/min',
  distance: 'km',
  absolutePressure: 'kPa abs',
  power: 'kW',
};

interface Size<Q extends Quantity> {
  readonly us: readonly [UnitOf<Q>, ...UnitOf<Q>[]];
  readonly metric: readonly [UnitOf<Q>, ...UnitOf<Q>[]];
}

/**
 * Units of like size in the two systems, the usual one first. Some quantities span sizes that no one unit fits: a bore
 * and the length of a line, a cup of oil and a reservoir, a gauge and a crankcase.
 */
const SIZES: { readonly [Q in Quantity]?: readonly Size<Q>[] } = {
  pressure: [
    { us: ['psi'], metric: ['kPa', 'bar', 'MPa', 'kgf/cm2'] },
    { us: ['inH2O', 'inHg'], metric: ['mbar', 'Pa'] },
  ],
  length: [
    { us: ['in'], metric: ['mm', 'cm'] },
    { us: ['ft'], metric: ['m'] },
  ],
  volume: [
    { us: ['floz'], metric: ['mL'] },
    { us: ['gal', 'qt', 'pt'], metric: ['L'] },
    { us: ['in3', 'ft3'], metric: ['L'] },
  ],
  mass: [
    { us: ['oz'], metric: ['g'] },
    { us: ['lb'], metric: ['kg'] },
  ],
  absolutePressure: [
    { us: ['psia'], metric: ['kPa abs', 'bar abs', 'kgf/cm2 abs', 'atm'] },
    { us: ['inHg abs'], metric: ['mbar abs'] },
  ],
  power: [{ us: ['hp'], metric: ['kW', 'PS', 'W'] }],
  flow: [
    { us: ['cfm'], metric: ['L/min', 'L/s'] },
    { us: ['gal/min'], metric: ['L/min', 'mL/min'] },
  ],
};

/** Written alike in both systems, so the unit in which a check is written stands: an age in years, a share in percent. */
const SAME_EVERYWHERE: ReadonlySet<Quantity> = new Set<Quantity>([
  'duration',
  'engineHours',
  'cycleRate',
  'rotationalSpeed',
  'ratio',
  'count',
  'kinematicViscosity',
  'dynamicViscosity',
  'density',
  'concentration',
  'angle',
]);

/**
 * The unit to show a quantity in.
 *
 * @param like the unit that a check or a limit is written in, where there is one. It tells the size meant: a line
 *   written in feet is shown in metres, not in millimetres, to a person who set metric units.
 * @example
 * unitFor(US_UNITS, 'pressure')          // 'psi'
 * unitFor(METRIC_UNITS, 'length')        // 'mm'
 * unitFor(METRIC_UNITS, 'length', 'ft')  // 'm'
 * unitFor(US_UNITS, 'duration', 'min')   // 'min'
 */
export function unitFor<Q extends Quantity>(preferences: UnitPreferences, quantity: Q, like?: UnitOf<Q>): UnitOf<Q> {
  const preferred: UnitOf<Q> = preferences[quantity];
  if (like === undefined) return preferred;
  if (SAME_EVERYWHERE.has(quantity)) return like;

  const sizes: readonly Size<Q>[] = SIZES[quantity] ?? [];
  const isUs = sizes.some(({ us }) => us.includes(preferred));
  const alternatives = sizes.filter(({ us, metric }) => us.includes(like) || metric.includes(like)).map(({ us, metric }) => (isUs ? us : metric));
  if (alternatives.some((units) => units.includes(preferred))) return preferred;
  if (alternatives.some((units) => units.includes(like))) return like;
  return alternatives[0]?.[0] ?? preferred;
}

/**
 * Preferences with what was stored or posted laid over them. Whatever is no quantity, or no unit of its quantity, is
 * left out, so that an old row can't break a page.
 *
 * @example
 * withUnits(US_UNITS, { pressure: 'bar', length: 'furlong' }).pressure // 'bar'; length stays 'in'
 */
export function withUnits(base: UnitPreferences, overrides: Readonly<Record<string, unknown>>): UnitPreferences {
  const valid = QUANTITY_IDS.flatMap((quantity) => {
    const id = Object.hasOwn(overrides, quantity) ? overrides[quantity] : undefined;
    return typeof id === 'string' && isUnitOf(quantity, id) ? [[quantity, id] as const] : [];
  });
  return { ...base, ...Object.fromEntries(valid) };
}
