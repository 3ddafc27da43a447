import Link from 'next/link';
import { buttonClass } from './Button';

interface Props {
  /** From 1. */
  page: number;
  pageCount: number;
  hrefFor: (page: number) => string;
  /** What is paged, for the name of the navigation: "Pages of units". */
  label: string;
  /** How many rows in all, printed beside. */
  total?: number;
}

/**
 * Back and on through a long list, by links. Renders only the count when one page holds it all.
 * @example <Pager label="Pages of units" page={2} pageCount={5} total={118} hrefFor={(page) => hrefWith({ page })} />
 */
export function Pager({ page, pageCount, hrefFor, label, total }: Props) {
  const count = total === undefined ? null : <span className="text-ink-soft"><span className="figure">{total.toLocaleString('en-GB')}</span> in all</span>;
  if (pageCount <= 1) return count && <p>{count}</p>;
  return (
    <nav aria-label={label} className="flex flex-wrap items-center gap-x-5 gap-y-2">
      {page > 1 && <Link rel="prev" href={hrefFor(page - 1)} className={buttonClass({ variant: 'quiet' })}>Previous page</Link>}
      <span>
        Page <span className="figure">{page}</span> of <span className="figure">{pageCount}</span>
      </span>
      {page < pageCount && <Link rel="next" href={hrefFor(page + 1)} className={buttonClass({ variant: 'quiet' })}>Next page</Link>}
      {count}
    </nav>
  );
}
