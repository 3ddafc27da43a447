import Link from 'next/link';
import type { ReactNode } from 'react';
import { EmptyState } from '@/components/ui/EmptyState';
import { Tag } from '@/components/ui/Tag';
import { dayText } from '@/lib/schemas/day-text';
import { termLabel } from '@/lib/schemas/terms';
import type { UnitPage } from '@/lib/services/unit/read';
import type { UnitPreferences } from '@/lib/units';
import { LifeLine } from './LifeLine';
import { measureText } from './MeasureField';

type Fit = UnitPage['fits'][number];
type Case = UnitPage['cases'][number];

interface Props {
  unitId: string;
  fits: readonly Fit[];
  cases: readonly Case[];
  today: string;
  units: UnitPreferences;
}

interface Entry {
  key: string;
  day: string;
  /** Of one day, what is later stands first. */
  rank: number;
  mark: 'fit' | 'out' | 'case';
  words: ReactNode;
}

const link = 'inline-flex min-h-8 items-center underline underline-offset-4';
const STATUS: Record<string, string> = { open: 'open', called: 'called', closed: 'closed' };

/** What happened to a unit, the latest first: compressors fitted and taken out, and the cases between. */
export function History({ unitId, fits, cases, today, units }: Props) {
  const entries = [...fits.flatMap((fit) => fitEntries(fit, unitId, units)), ...cases.map(caseEntry)].toSorted((a, b) => b.day.localeCompare(a.day) || b.rank - a.rank);
  if (entries.length === 0) {
    return <EmptyState title="No history yet">Record the compressor that is on the unit: a case then knows how far it has run and how it was fitted.</EmptyState>;
  }
  return (
    <>
      <LifeLine fits={fits.toReversed().map((fit) => ({ id: fit.id, from: fit.installedOn, to: fit.removedOn, label: fit.modelName }))} cases={cases.map((one) => one.openedOn)} today={today} />
      <ol className="grid">
        {entries.map(({ key, day, mark, words }) => (
          <li key={key} className="grid grid-cols-[1.25rem_1fr] gap-x-3 sm:grid-cols-[7.5rem_1.25rem_1fr]">
            <time dateTime={day} className="figure col-start-2 text-[0.9375rem] text-ink-soft sm:col-start-1 sm:pt-1 sm:text-right">{dayText(day)}</time>
            <span aria-hidden="true" className="relative col-start-1 row-span-2 row-start-1 border-l border-edge sm:col-start-2 sm:row-span-1 ml-2">
              <Mark kind={mark} />
            </span>
            <div className="col-start-2 pb-5 sm:col-start-3">{words}</div>
          </li>
        ))}
      </ol>
    </>
  );
}

function fitEntries(fit: Fit, unitId: string, units: UnitPreferences): Entry[] {
  const href = `/units/${unitId}/fits/${fit.id}`;
  const at = measureText(fit.installedOdometerM, { quantity: 'distance' }, units);
  const ran = measureText(fit.ranM, { quantity: 'distance' }, units);
  const fitted: Entry = {
    key: `${fit.id}-on`,
    day: fit.installedOn,
    rank: 1,
    mark: 'fit',
    words: (
      <>
        <Link href={href} className={link}><strong>{fit.modelName}</strong></Link> fitted, {termLabel('condition', fit.condition)?.toLowerCase()}
        {at && <>, at <span className="figure">{at}</span></>}.{' '}
        {fit.removedOn === null && <Tag tone="strong">on it now</Tag>}
        {fit.removedOn === null && ran && <p>It has run <span className="figure">{ran}</span> by the readings.</p>}
      </>
    ),
  };
  if (fit.removedOn === null) return [fitted];
  const out: Entry = {
    key: `${fit.id}-off`,
    day: fit.removedOn,
    rank: 0,
    mark: 'out',
    words: (
      <>
        {fit.modelName} came out{ran && <> after <span className="figure">{ran}</span></>}.
        {fit.whyOut && <p className="text-ink-soft">{termLabel('whyOut', fit.whyOut)}.</p>}
      </>
    ),
  };
  return [out, fitted];
}

function caseEntry(one: Case): Entry {
  return {
    key: one.id,
    day: one.openedOn,
    rank: 2,
    mark: 'case',
    words: (
      <>
        <Link href={`/cases/${one.id}`} className={link}>Case {one.number}</Link>: {one.complaints.join(', ').toLowerCase()}. <Tag>{STATUS[one.status] ?? one.status}</Tag>
        {one.cause && <p>Called: {one.cause}.</p>}
      </>
    ),
  };
}

/** A square is a compressor: filled when it goes on, hollow when it comes out. A case is a drop of oil. */
function Mark({ kind }: { kind: Entry['mark'] }) {
  return (
    <svg viewBox="0 0 16 16" className="absolute top-1.5 -left-2 size-4 bg-paper" stroke="currentColor" strokeWidth="2">
      {kind === 'case' ? (
        <path d="M8 1.5C10.5 5 12.5 7.5 12.5 10a4.5 4.5 0 0 1-9 0C3.5 7.5 5.5 5 8 1.5Z" className="fill-oil-fill" strokeWidth="1.25" />
      ) : (
        <rect x="2.5" y="2.5" width="11" height="11" fill={kind === 'fit' ? 'currentColor' : 'none'} />
      )}
    </svg>
  );
}
