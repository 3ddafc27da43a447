import { FIGURE_IDS, type FigureId } from './figures';
import type { Pooled } from './pool';
import { laterFirst, type BaselineSet, type Conditions, type Occasion } from './set';

/** Fewer units are no spread but so many single cases. Common practice, no source: a judgement. */
export const LEAST_UNITS = 3;

/** What one figure of a unit is compared with, SI: enough to say later what was compared with, and how it was known. */
export type Baseline =
  | { from: 'own'; figure: FigureId; si: number; errorSi: number; setId: string; measuredOn: string; occasion: Occasion; conditions: Conditions }
  | ({ from: 'model'; figure: FigureId } & Pooled);

interface Known {
  /** Sets of the unit itself, in any order. */
  own: readonly BaselineSet[];
  /** The day on which its compressor was fitted, YYYY-MM-DD: what was measured before was another one. null: not known, all count. */
  since: string | null;
  /** Of the model of that compressor. */
  pooled: Partial<Record<FigureId, Pooled>>;
}

/**
 * What counts for each figure: the unit's own latest set since its compressor was fitted, else its model's pool of
 * three units or more, else nothing. Figures are chosen one by one: a set that left one out leaves it to an older set.
 *
 * @returns figures for which nothing counts are absent
 * @example baselineFor({ own: [], since: null, pooled })['build-up-time']?.from // 'model'
 */
export function baselineFor({ own, since, pooled }: Known): Partial<Record<FigureId, Baseline>> {
  const sets = own.filter(({ measuredOn }) => since === null || measuredOn >= since).toSorted(laterFirst);
  return Object.fromEntries(
    FIGURE_IDS.flatMap((figure) => {
      const baseline = ofOwn(figure, sets) ?? ofModel(figure, pooled[figure]);
      return baseline ? [[figure, baseline]] : [];
    }),
  );
}

function ofOwn(figure: FigureId, laterSetsFirst: readonly BaselineSet[]): Baseline | undefined {
  const set = laterSetsFirst.find(({ figures }) => figures[figure]);
  const measured = set?.figures[figure];
  if (!set || !measured) return undefined;
  const { id, measuredOn, occasion, conditions } = set;
  return { from: 'own', figure, ...measured, setId: id, measuredOn, occasion, conditions };
}

const ofModel = (figure: FigureId, pooled: Pooled | undefined): Baseline | undefined =>
  pooled && pooled.units >= LEAST_UNITS ? { from: 'model', figure, ...pooled } : undefined;

/** The value to compare with, SI. @example usualOf(baseline) // 24 */
export const usualOf = (baseline: Baseline): number => (baseline.from === 'own' ? baseline.si : baseline.median);
