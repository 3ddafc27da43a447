import Link from 'next/link';
import { useId, type ReactNode } from 'react';
import { classes } from './classes';
import { EmptyState } from './EmptyState';

export interface Column<Row> {
  key: string;
  header: ReactNode;
  /** Unit of the figures in it, printed after the header in its own case. */
  unit?: string;
  cell: (row: Row) => ReactNode;
  /** Right-aligned, in the face of measured figures. */
  numeric?: boolean;
  /** The head links to the same list sorted by this column (needs `sortHref`). */
  sortable?: boolean;
  /** The cell that names the row; one column at most. On a phone it heads the row's lines, wherever its column stands. */
  rowHeader?: boolean;
  /** Left out on a tablet, where a table this wide would run off the page; a phone's lines and a desk have room for it. */
  spare?: boolean;
}

export interface Sort {
  key: string;
  direction: 'asc' | 'desc';
}

interface Props<Row> {
  /** What the table holds: printed above it, and its accessible name. */
  caption: ReactNode;
  captionHidden?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  sort?: Sort;
  /** Where a sortable head leads. */
  sortHref?: (sort: Sort) => string;
  /** What stands there without rows: say what to do next. */
  empty?: ReactNode;
}

/**
 * A ledger, rendered on the server. Sorting is by links, so that a list's state is in its address. On a phone each row
 * becomes lines under each other, label and value, and the roles keep it a table to a screen reader; on a screen in
 * between it scrolls sideways inside a region that the keyboard reaches.
 * @example <DataTable caption="Units" columns={columns} rows={units} rowKey={(u) => u.id} sort={sort} sortHref={(s) => hrefWith({ sort: s.key, direction: s.direction })} empty={<EmptyState title="No unit matches">Clear the filter.</EmptyState>} />
 */
export function DataTable<Row>({ caption, captionHidden, columns, rows, rowKey, sort, sortHref, empty }: Props<Row>) {
  const captionId = useId();
  if (rows.length === 0) return empty ?? <EmptyState title="Nothing here yet" />;
  return (
    <div role="region" aria-labelledby={captionId} tabIndex={0} className="scroll-x relative">
      <table role="table" className="ledger max-sm:block">
        <caption id={captionId} className={captionHidden ? 'sr-only' : 'label text-left text-ink-soft max-sm:block'}>{caption}</caption>
        <thead role="rowgroup" className="max-sm:block max-sm:border-b-2 max-sm:border-ink">
          <tr role="row" className={classes('max-sm:flex max-sm:flex-wrap max-sm:items-center max-sm:gap-x-5', sortHref && "max-sm:before:text-ink-soft max-sm:before:content-['Sort_by']")}>
            {columns.map((column) => (
              <HeadCell key={column.key} column={column} sort={sort} sortHref={sortHref} />
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="max-sm:block">
          {rows.map((row) => (
            <tr key={rowKey(row)} role="row" className="max-sm:flex max-sm:flex-col max-sm:border-b max-sm:border-rule max-sm:py-3">
              {columns.map((column) => <Cell key={column.key} column={column} row={row} />)}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Cell<Row>({ column, row }: { column: Column<Row>; row: Row }) {
  const value = column.cell(row);
  const Tag = column.rowHeader ? 'th' : 'td';
  return (
    <Tag
      role={column.rowHeader ? 'rowheader' : 'cell'}
      scope={column.rowHeader ? 'row' : undefined}
      className={classes('max-sm:border-0! max-sm:p-0!', column.numeric && 'numeric', column.spare && 'sm:max-lg:hidden', column.rowHeader && 'max-sm:order-first', value === null || value === undefined || value === '' ? 'max-sm:hidden' : 'max-sm:flex max-sm:items-baseline max-sm:gap-4')}
    >
      {!column.rowHeader && <span aria-hidden="true" className="label w-28 shrink-0 text-left text-ink-soft sm:hidden">{column.header}</span>}
      <span className="contents max-sm:block max-sm:min-w-0 max-sm:wrap-anywhere">{value}</span>
    </Tag>
  );
}

function HeadCell<Row>({ column, sort, sortHref }: { column: Column<Row> } & Pick<Props<Row>, 'sort' | 'sortHref'>) {
  const sorted = sort?.key === column.key ? sort.direction : undefined;
  const words = column.unit ? <span>{column.header} <span className="unit">{column.unit}</span></span> : column.header;
  const next: Sort = { key: column.key, direction: sorted === 'asc' ? 'desc' : 'asc' };
  return (
    <th
      scope="col"
      role="columnheader"
      aria-sort={sorted && (sorted === 'asc' ? 'ascending' : 'descending')}
      className={classes('label max-sm:border-0! max-sm:p-0!', column.numeric && 'numeric', column.spare && 'sm:max-lg:hidden', !(column.sortable && sortHref) && 'max-sm:sr-only')}
    >
      {column.sortable && sortHref ? (
        <Link href={sortHref(next)} scroll={false} className="inline-flex min-h-8 items-end gap-1.5 underline decoration-edge decoration-dotted underline-offset-4 hover:decoration-solid max-sm:min-h-touch max-sm:items-center">
          {words}
          <SortMark direction={sorted} />
        </Link>
      ) : (
        words
      )}
    </th>
  );
}

/** Two triangles, the one that holds filled. */
function SortMark({ direction }: { direction: Sort['direction'] | undefined }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 10 16" className="mb-0.5 h-3.5 w-2.5 shrink-0" stroke="currentColor">
      <path d="M1.5 6.5 5 1.5 8.5 6.5Z" fill={direction === 'asc' ? 'currentColor' : 'none'} />
      <path d="M1.5 9.5 5 14.5 8.5 9.5Z" fill={direction === 'desc' ? 'currentColor' : 'none'} />
    </svg>
  );
}
