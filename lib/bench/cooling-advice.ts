import { pressureAfterCooling } from '@/lib/air-and-oil/leak-down';
import { gaugePressure, temperature, toAbsolute, toSi } from '@/lib/units';
import type { Writing } from './read-texts';
import { shown } from './show';

/** A tank as it comes off the road, in SI. */
const TANK = {
  pressure: toSi(120, 'pressure', 'psi'),
  hot: toSi(120, 'temperature', 'degF'),
  cooledBy: toSi(20, 'temperatureDifference', 'degF'),
};

/**
 * How far the gauge of a sealed tank falls by cooling alone. Pa; 0 where nothing cools.
 *
 * Δp = p (1 - T_end / T_start), absolute
 *
 * @param tank Pa gauge; K above 0; K, less than the tank is hot
 * @throws OutOfRange
 * @see ideal gas
 * @example fallByCooling({ pressure, hot, cooledBy }) // 120 psi at 120 °F, cooled by 20 °F: 4.6 psi
 */
export function fallByCooling({ pressure, hot, cooledBy }: { pressure: number; hot: number; cooledBy: number } = TANK): number {
  const start = toAbsolute(gaugePressure(pressure));
  return start - pressureAfterCooling({ startPressurePa: start, startTemperatureK: temperature(hot), endTemperatureK: temperature(hot - cooledBy) });
}

/** What to do about temperature in a leak-down, and why, in the person's units. */
export function coolingAdvice(writing: Writing): string {
  const pressure = (si: number, figures: number) => shown(si, { quantity: 'pressure', like: 'psi' }, writing, figures);
  const hot = shown(TANK.hot, { quantity: 'temperature', like: 'degF' }, writing, hotFigures(writing));
  const cooledBy = shown(TANK.cooledBy, { quantity: 'temperatureDifference', like: 'degF' }, writing, 2);
  return (
    'Let the tanks settle to the air around them first; or note the temperature of a tank when you start and when you stop, and give both below. ' +
    `A sealed tank at ${pressure(TANK.pressure, 3)} and ${hot} that cools by ${cooledBy} loses ${pressure(fallByCooling(), 2)} with no leak at all: more than a leak may take in a minute.`
  );
}

/** Whole degrees: nobody reads a tank's skin to a tenth. */
const hotFigures = ({ units }: Writing) => (units.temperature === 'degC' ? 2 : 3);
