import { quantileSorted } from 'simple-statistics';
import { FIGURE_IDS, type FigureId } from './figures';
import { laterFirst, type BaselineSet } from './set';

/** How a figure lies over the units of a model, SI. */
export interface Pooled {
  median: number;
  /** Quartiles: the middle half of the units lies between them. */
  lower: number;
  upper: number;
  /** Units that have the figure; each counts once. */
  units: number;
  /** Sets in which it was measured, those included that a later one of the same unit replaced. */
  sets: number;
  /** Days of the earliest and the latest set that counted. */
  firstOn: string;
  lastOn: string;
}

/**
 * Pools the sets of a model's units, figure by figure. A unit counts once, by its latest set that has the figure, so
 * that one unit that is measured at every service doesn't outvote the others.
 *
 * @param sets of one model, of any units, in any order
 * @returns figures that no set has are absent
 * @example pool(sets)['build-up-time'] // { median: 24, lower: 21, upper: 27, units: 7, sets: 9, … }
 */
export function pool(sets: readonly BaselineSet[]): Partial<Record<FigureId, Pooled>> {
  const ordered = sets.toSorted(laterFirst);
  return Object.fromEntries(
    FIGURE_IDS.flatMap((figure) => {
      const pooled = poolOf(figure, ordered);
      return pooled ? [[figure, pooled]] : [];
    }),
  );
}

function poolOf(figure: FigureId, laterSetsFirst: readonly BaselineSet[]): Pooled | undefined {
  const having = laterSetsFirst.filter((set) => set.figures[figure]);
  const latest = new Map<string, BaselineSet>();
  for (const set of having) if (!latest.has(set.unitId)) latest.set(set.unitId, set);
  const days = [...latest.values()].map(({ measuredOn }) => measuredOn).sort();
  const [firstOn, lastOn] = [days[0], days.at(-1)];
  if (firstOn === undefined || lastOn === undefined) return undefined;
  const values = [...latest.values()].flatMap((set) => set.figures[figure]?.si ?? []).sort((a, b) => a - b);
  const at = (share: number) => quantileSorted(values, share);
  return { median: at(0.5), lower: at(0.25), upper: at(0.75), units: latest.size, sets: having.length, firstOn, lastOn };
}
