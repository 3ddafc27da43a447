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
  /** The cell that names the row; one column at most. */
  rowHeader?: boolean;
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
 * A ledger, rendered on the server. Sorting is by links, so that a list's state is in its address; on a
 * narrow screen it scrolls sideways inside a region that the keyboard reaches.
 * @example <DataTable caption="Units" columns={columns} rows={units} rowKey={(u) => u.id} sort={sort} sortHref={(s) => hrefWith({ sort: s.key, direction: s.direction })} empty={<EmptyState title="No unit matches">Clear the filter.</EmptyState>} />
 */
export function DataTable<Row>({ caption, captionHidden, columns, rows, rowKey, sort, sortHref, empty }: Props<Row>) {
  const captionId = useId();
  if (rows.length === 0) return empty ?? <EmptyState title="Nothing here yet" />;
  return (
    <div role="region" aria-labelledby={captionId} tabIndex={0} className="scroll-x">
      <table className="ledger">
        <caption id={captionId} className={captionHidden ? 'sr-only' : 'label text-left text-ink-soft'}>{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <HeadCell key={column.key} column={column} sort={sort} sortHref={sortHref} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map((column) => {
                const Cell = column.rowHeader ? 'th' : 'td';
                return (
                  <Cell key={column.key} scope={column.rowHeader ? 'row' : undefined} className={classes(column.numeric && 'numeric')}>
                    {column.cell(row)}
                  </Cell>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function HeadCell<Row>({ column, sort, sortHref }: { column: Column<Row> } & Pick<Props<Row>, 'sort' | 'sortHref'>) {
  const sorted = sort?.key === column.key ? sort.direction : undefined;
  const words = column.unit ? <span>{column.header} <span className="unit">{column.unit}</span></span> : column.header;
  const next: Sort = { key: column.key, direction: sorted === 'asc' ? 'desc' : 'asc' };
  return (
    <th
      scope="col"
      aria-sort={sorted && (sorted === 'asc' ? 'ascending' : 'descending')}
      className={classes('label', column.numeric && 'numeric')}
    >
      {column.sortable && sortHref ? (
        <Link href={sortHref(next)} scroll={false} className="inline-flex min-h-8 items-end gap-1.5 underline decoration-edge decoration-dotted underline-offset-4 hover:decoration-solid">
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
