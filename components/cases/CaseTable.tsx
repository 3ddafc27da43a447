import Link from 'next/link';
import type { ReactNode } from 'react';
import type { Sort } from '@/components/ui/DataTable';
import { classes } from '@/components/ui/classes';
import { SightGlass } from '@/components/ui/SightGlass';
import { Tag } from '@/components/ui/Tag';
import { dayText } from '@/lib/schemas/day-text';
import { HoldMark } from './HoldMark';
import { activityText, standsText, stoodText } from './words';

export interface CaseRow {
  id: string;
  number: number;
  status: string;
  fleetNumber: string;
  siteName: string;
  timeZone: string;
  odometer: string | null;
  assignedTo: string | null;
  openedOn: string;
  days: number;
  activeAt: string;
  complaints: string[];
  leader: { name: string; p: number } | null;
  holds: string[];
}

interface Props {
  rows: readonly CaseRow[];
  sort: Sort;
  sortHref: (sort: Sort) => string;
  now: Date;
}

const STATUS: Record<string, string> = { open: 'Open', called: 'Called', closed: 'Closed' };

/**
 * What stands where: a ledger on a wide screen, on a phone each row as lines under each
 * other, on a tablet in two columns. The roles keep it a table
 * to a screen reader when it is laid out as blocks.
 */
export function CaseTable({ rows, sort, sortHref, now }: Props) {
  const head = (label: string, key?: string, turned?: boolean) => <HeadCell {...{ label, sort, sortHref, turned }} sortKey={key} />;
  return (
    <table role="table" className="ledger max-lg:block">
      <caption className="sr-only">Cases</caption>
      <thead role="rowgroup" className="max-lg:block max-lg:border-b-2 max-lg:border-ink max-lg:pb-1">
        <tr role="row" className="max-lg:flex max-lg:flex-wrap max-lg:items-center max-lg:gap-x-5 max-lg:before:text-ink-soft max-lg:before:content-['Sort_by']">
          {head('Unit', 'unit')}
          {head('Where', 'site')}
          {head('With')}
          {head('Stands', 'opened', true)}
          {head('Complaint, and what leads')}
          {head('Last activity', 'active')}
        </tr>
      </thead>
      <tbody role="rowgroup" className="max-lg:block">
        {rows.map((row) => (
          <tr key={row.id} role="row" className="group max-lg:relative max-lg:block sm:max-lg:grid sm:max-lg:grid-cols-2 sm:max-lg:grid-rows-[auto_auto_auto_1fr] sm:max-lg:gap-x-10 max-lg:border-b max-lg:border-rule max-lg:py-4 has-[a:focus-visible]:bg-sunk">
            <th role="rowheader" scope="row" className={cell('lg:max-w-64')}>
              <span className="flex flex-wrap items-center gap-x-3 lg:block">
                <Link data-row href={`/cases/${row.id}`} className="inline-flex min-h-touch items-center gap-2 whitespace-nowrap max-lg:after:absolute max-lg:after:inset-0">
                  <span className="heading text-[1.375rem] underline decoration-2 underline-offset-4">{row.fleetNumber}</span>
                  <span className="text-[0.9375rem] font-normal text-ink-soft">case {row.number}</span>
                </Link>
                <span className="ml-auto lg:hidden"><Tag>{STATUS[row.status] ?? row.status}</Tag></span>
              </span>
              <HoldMark checks={row.holds} />
            </th>
            <td role="cell" className={cell('lg:whitespace-nowrap')}>
              {row.siteName}
              {row.odometer && <Soft><span className="figure">{row.odometer}</span></Soft>}
            </td>
            <td role="cell" className={cell('lg:whitespace-nowrap')}>
              <span className="text-ink-soft lg:hidden">With </span>
              {row.assignedTo ?? 'nobody'}
            </td>
            <td role="cell" className={cell('lg:whitespace-nowrap')}>
              {row.status === 'closed' ? `stood ${stoodText(row.days)}` : <><span className="text-ink-soft lg:hidden">Stands </span>{standsText(row.days)}</>}
              {row.days > 0 && <Soft>{row.status === 'closed' ? 'from' : 'since'} {dayText(row.openedOn)}</Soft>}
            </td>
            <td role="cell" className={cell('max-sm:mt-2 sm:max-lg:col-start-2 sm:max-lg:row-span-3 sm:max-lg:row-start-1')}>
              <span className="max-lg:block max-lg:text-ink-soft lg:hidden">{row.complaints.join(', ')}</span>
              <span className="flex items-center gap-3">
                {row.leader && <SightGlass label={row.leader.name} value={row.leader.p} size="small" />}
                <span className="min-w-0">
                  <span className="block text-[0.9375rem] leading-snug text-ink-soft max-lg:hidden">{row.complaints.join(', ')}</span>
                  {row.leader?.name ?? 'Not ranked'}
                </span>
              </span>
            </td>
            <td role="cell" className={cell('lg:whitespace-nowrap sm:max-lg:col-start-2 sm:max-lg:row-start-4')}>
              <span className="max-lg:hidden"><Tag>{STATUS[row.status] ?? row.status}</Tag></span>
              <span className="text-[0.9375rem] text-ink-soft lg:block"><span className="lg:hidden">Last activity </span>{activityText(row.activeAt, row.timeZone, now)}</span>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const cell = (more?: string) => classes('max-lg:block max-lg:border-0! max-lg:p-0!', more);

/** A second line of a cell; on a phone it goes on in the same line. */
const Soft = ({ children }: { children: ReactNode }) => (
  <span className="text-[0.9375rem] text-ink-soft lg:block">
    <span className="lg:hidden">, </span>
    {children}
  </span>
);

/** `turned`: the column shows the sort key the other way round, as days since it. The arrow is that of what is shown. */
function HeadCell({ label, sortKey, sort, sortHref, turned = false }: { label: string; sortKey?: string; turned?: boolean } & Pick<Props, 'sort' | 'sortHref'>) {
  const sorted = sortKey !== undefined && sort.key === sortKey ? sort.direction : undefined;
  const shown = !turned || !sorted ? sorted : sorted === 'asc' ? 'desc' : 'asc';
  return (
    <th
      role="columnheader"
      scope="col"
      aria-sort={shown && (shown === 'asc' ? 'ascending' : 'descending')}
      className={classes('label max-lg:border-0! max-lg:p-0!', !sortKey && 'max-lg:sr-only')}
    >
      {sortKey ? (
        <Link href={sortHref({ key: sortKey, direction: sorted === 'asc' ? 'desc' : 'asc' })} scroll={false} className="inline-flex min-h-8 items-end gap-1 underline decoration-edge decoration-dotted underline-offset-4 hover:decoration-solid max-lg:min-h-touch max-lg:items-center">
          {label}
          <span aria-hidden="true" className="figure w-3">{shown === 'asc' ? '↑' : shown === 'desc' ? '↓' : ''}</span>
        </Link>
      ) : (
        label
      )}
    </th>
  );
}
