import type { ReactNode } from 'react';
import { classes } from './classes';

export interface Definition {
  term: ReactNode;
  value: ReactNode;
  /** The value is a measured figure. */
  figure?: boolean;
}

/**
 * Facts of one thing, as on a printed form: label, value, hairline. Absent values read "not recorded".
 * @example <DefinitionList items={[{ term: 'Odometer', value: '412 300 mi', figure: true }, { term: 'Site', value: site.name }]} />
 */
export function DefinitionList({ items, columns = 1 }: { items: readonly Definition[]; columns?: 1 | 2 }) {
  return (
    <dl className={classes('border-t border-ink', columns === 2 && 'gap-x-10 md:grid md:grid-cols-2')}>
      {items.map(({ term, value, figure }, index) => (
        <div key={index} className="grid grid-cols-[minmax(8rem,2fr)_3fr] items-baseline gap-4 border-b border-rule py-2">
          <dt className="label text-ink-soft">{term}</dt>
          <dd className={figure ? 'figure' : undefined}>{value ?? <span className="text-ink-soft">not recorded</span>}</dd>
        </div>
      ))}
    </dl>
  );
}
