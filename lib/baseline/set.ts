import type { FigureId } from './figures';

/** When a set is measured: the unit is known to be in good order. */
export const OCCASIONS = ['service', 'proved-repair'] as const;
export type Occasion = (typeof OCCASIONS)[number];

/** What it was like, SI; null: not said. */
export interface Conditions {
  /** Outside temperature, K. */
  ambientK: number | null;
  /** Speed of the engine, turns a second. */
  engineSpeedPerS: number | null;
  /** How long it had run loaded, s. */
  loadedS: number | null;
}

/** A figure as it was measured, SI, with how far it can be off. */
export interface MeasuredFigure {
  si: number;
  errorSi: number;
}

/** What was measured on a unit in good order on a day. */
export interface BaselineSet {
  id: string;
  unitId: string;
  /** YYYY-MM-DD, a day of the unit's site. */
  measuredOn: string;
  occasion: Occasion;
  conditions: Conditions;
  /** Those that were left out are absent. */
  figures: Partial<Record<FigureId, MeasuredFigure>>;
}

/** Later first; two of a day by their ids, which are made in order of time. */
export const laterFirst = (a: Pick<BaselineSet, 'measuredOn' | 'id'>, b: Pick<BaselineSet, 'measuredOn' | 'id'>): number =>
  b.measuredOn.localeCompare(a.measuredOn) || b.id.localeCompare(a.id);
