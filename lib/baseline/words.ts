import { dayText } from '@/lib/schemas/day-text';
import { differenceOf, formatQuantity, unitFor, type Quantity, type UnitPreferences } from '@/lib/units';
import { usualOf, type Baseline } from './baseline-for';
import { compare } from './compare';
import { figureOf, type FigureId } from './figures';
import type { Conditions, Occasion } from './set';

export const OCCASION_WORDS: Readonly<Record<Occasion, string>> = { service: 'At a service', 'proved-repair': 'At a proved repair' };

const unitOf = (figure: FigureId, units: UnitPreferences) => {
  const { quantity, like } = figureOf(figure);
  return { quantity, unit: unitFor<Quantity>(units, quantity, like) };
};

/** @example figureText('build-up-time', 24, US_UNITS) // '24 s' */
export const figureText = (figure: FigureId, si: number, units: UnitPreferences): string => formatQuantity<Quantity>(si, unitOf(figure, units));

/** @example conditionsText({ ambientK: 293.15, engineSpeedPerS: null, loadedS: null }, METRIC_UNITS) // '20 °C outside' */
export function conditionsText({ ambientK, engineSpeedPerS, loadedS }: Conditions, units: UnitPreferences): string {
  return [
    ambientK !== null && `${formatQuantity(ambientK, { quantity: 'temperature', unit: units.temperature })} outside`,
    engineSpeedPerS !== null && formatQuantity(engineSpeedPerS, { quantity: 'rotationalSpeed', unit: units.rotationalSpeed }),
    loadedS !== null && `${formatQuantity(loadedS, { quantity: 'duration', unit: 'min' })} loaded`,
  ]
    .filter(Boolean)
    .join(', ');
}

/**
 * What is usual, and from whom it is known.
 *
 * @example 'Usual for this unit: 146 °C, own set of 12 May 2026 (20 °C outside, 1,600 rpm)'
 * @example 'Usual for its model: median 150 °C, middle half 144 °C to 158 °C, 7 units'
 */
export function usualText(baseline: Baseline, units: UnitPreferences): string {
  const text = (si: number) => figureText(baseline.figure, si, units);
  if (baseline.from === 'model') {
    return `Usual for its model: median ${text(baseline.median)}, middle half ${text(baseline.lower)} to ${text(baseline.upper)}, ${baseline.units} units`;
  }
  // Only the head's reading depends on them so much that they are asked for.
  const conditions = figureOf(baseline.figure).conditions.length > 0 ? conditionsText(baseline.conditions, units) : '';
  return `Usual for this unit: ${text(baseline.si)}, own set of ${dayText(baseline.measuredOn)}${conditions && ` (${conditions})`}`;
}

/**
 * How a value stands to what is usual, with both.
 *
 * @param value SI, of the baseline's quantity
 * @example comparisonText(457.15, baseline, METRIC_UNITS) // '38 °C above this unit’s own 146 °C of 12 May 2026'
 */
export function comparisonText(value: number, baseline: Baseline, units: UnitPreferences): string {
  const { differenceSi, outside } = compare(value, baseline);
  const { quantity, unit } = unitOf(baseline.figure, units);
  const size = formatQuantity<Quantity>(Math.abs(differenceSi), { quantity: differenceOf(quantity), unit });
  const usual = figureText(baseline.figure, usualOf(baseline), units);
  const isSame = figureText(baseline.figure, value, units) === usual;
  const where = isSame ? 'the same as' : `${size} ${differenceSi > 0 ? 'above' : 'below'}`;
  if (baseline.from === 'own') return `${where} this unit’s own ${usual} of ${dayText(baseline.measuredOn)}`;
  const spread = outside ? `${outside} the middle half` : 'within the middle half';
  return `${where} its model’s median of ${usual}, ${spread} of ${baseline.units} units`;
}
