import { ButtonLink } from '@/components/ui/Button';
import { DefinitionList } from '@/components/ui/DefinitionList';
import { Disclosure } from '@/components/ui/Disclosure';
import { keepFigures } from '@/components/ui/figures';
import { LEAST_UNITS } from '@/lib/baseline/baseline-for';
import { FIGURES, figureOf } from '@/lib/baseline/figures';
import { conditionsText, figureText, OCCASION_WORDS } from '@/lib/baseline/words';
import { dayText } from '@/lib/schemas/day-text';
import type { UnitBaseline } from '@/lib/services/baseline/read';
import type { UnitPreferences } from '@/lib/units';

interface Props {
  baseline: UnitBaseline;
  units: UnitPreferences;
  /** Where a new set is measured; left out for who may not. */
  measureHref?: string;
}

/** What a unit reads in good order: the figure that counts, from whom it is known, and all sets behind it. */
export function Baseline({ baseline, units, measureHref }: Props) {
  const { figures, sets, since } = baseline;
  return (
    <>
      <DefinitionList items={figures.map((row) => ({ term: keepFigures(figureOf(row.figure).name), value: <Counts row={row} units={units} /> }))} />
      {measureHref && <p className="mt-3"><ButtonLink variant="quiet" href={measureHref}>Measure a set</ButtonLink></p>}
      {sets.length > 0 && (
        <Disclosure summary={sets.length === 1 ? 'The set measured on it' : `${sets.length} sets measured on it`}>
          <ul className="border-t border-ink">
            {sets.map((set) => <OneSet key={set.id} set={set} isEarlier={since !== null && set.measuredOn < since} units={units} />)}
          </ul>
        </Disclosure>
      )}
    </>
  );
}

function Counts({ row: { figure, counts, pooled }, units }: { row: UnitBaseline['figures'][number]; units: UnitPreferences }) {
  const text = (si: number) => keepFigures(figureText(figure, si, units));
  if (!counts) {
    const few = pooled && pooled.units < LEAST_UNITS && `${pooled.units} ${pooled.units === 1 ? 'unit' : 'units'} of its model so far; it takes ${LEAST_UNITS}.`;
    return <span className="text-ink-soft">None yet. {few}</span>;
  }
  return (
    <>
      <span className="figure font-bold">{text(counts.from === 'own' ? counts.si : counts.median)}</span>
      <span className="block text-[0.9375rem] text-ink-soft">
        {counts.from === 'own'
          ? `Own set of ${dayText(counts.measuredOn)}. ${conditionsOf(counts, units)}`
          : `Median of ${counts.units} units of its model, middle half ${text(counts.lower)} to ${text(counts.upper)}, ${counts.sets} sets.`}
      </span>
    </>
  );
}

function conditionsOf({ figure, conditions }: { figure: UnitBaseline['figures'][number]['figure']; conditions: UnitBaseline['sets'][number]['conditions'] }, units: UnitPreferences): string {
  const text = figureOf(figure).conditions.length > 0 ? conditionsText(conditions, units) : '';
  return text && `${keepFigures(text)}.`;
}

function OneSet({ set, isEarlier, units }: { set: UnitBaseline['sets'][number]; isEarlier: boolean; units: UnitPreferences }) {
  const conditions = conditionsText(set.conditions, units);
  return (
    <li className="border-b border-rule py-2">
      <p>
        <strong>{dayText(set.measuredOn)}</strong>, {OCCASION_WORDS[set.occasion].toLowerCase()}
        {set.by && `, by ${set.by}`}
        {isEarlier && '. On the compressor before this one, so that it counts no more'}.
      </p>
      <ul className="my-1 ml-5 list-disc">
        {FIGURES.flatMap(({ id, name }) => {
          const measured = set.figures[id];
          return measured ? [<li key={id}>{keepFigures(name)}: <span className="figure">{figureText(id, measured.si, units)}</span></li>] : [];
        })}
      </ul>
      {conditions && <p className="text-[0.9375rem] text-ink-soft">{keepFigures(conditions)}</p>}
      {set.note && <p className="text-[0.9375rem] text-ink-soft">{set.note}</p>}
    </li>
  );
}
