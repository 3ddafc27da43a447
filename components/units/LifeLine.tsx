import { classes } from '@/components/ui/classes';

interface Span {
  id: string;
  from: string;
  /** Null: it is still on. */
  to: string | null;
  label: string;
}

interface Props {
  fits: readonly Span[];
  /** Days on which cases were opened. */
  cases: readonly string[];
  today: string;
}

/** Days of the calendar, both as "YYYY-MM-DD". */
const daysFrom = (from: string, to: string): number => Math.round((Date.parse(to) - Date.parse(from)) / 86_400_000);

/**
 * Fits as bars and cases as marks along the years, so that a short life shows at a glance. Drawn only: the history
 * under it says the same in words.
 */
export function LifeLine({ fits, cases, today }: Props) {
  const first = [...fits.map((fit) => fit.from), ...cases].toSorted()[0];
  if (first === undefined) return null;
  const whole = Math.max(daysFrom(first, today), 1);
  const at = (day: string) => `${(100 * Math.min(Math.max(daysFrom(first, day), 0), whole)) / whole}%`;
  const width = (from: string, to: string) => `${(100 * Math.max(daysFrom(from, to), 0)) / whole}%`;
  const years = Array.from({ length: Number(today.slice(0, 4)) - Number(first.slice(0, 4)) }, (_, index) => `${Number(first.slice(0, 4)) + index + 1}`);
  return (
    <div aria-hidden="true" className="mx-1 mb-6 select-none">
      <div className="relative h-5">
        {cases.map((day, index) => (
          <span key={index} className="absolute bottom-0 h-4 w-0 -translate-x-1/2 border-l-[3px] border-oil-fill" style={{ left: at(day) }} />
        ))}
      </div>
      <div className="relative h-9 border-y border-rule">
        {fits.map(({ id, from, to, label }, index) => (
          <span
            key={id}
            className={classes('absolute inset-y-1 overflow-hidden border border-ink px-1.5 text-sm leading-6 whitespace-nowrap', index % 2 === 0 ? 'bg-sunk' : 'bg-sheet', to === null && 'border-r-4')}
            style={{ left: at(from), width: width(from, to ?? today) }}
          >
            {label}
          </span>
        ))}
      </div>
      <div className="figure relative h-6 overflow-hidden text-xs text-ink-soft">
        {years.map((year) => (
          <span key={year} className="absolute top-0 h-2 border-l border-edge pt-2 pl-1" style={{ left: at(`${year}-01-01`) }}>
            {years.length <= 6 || Number(year) % 5 === 0 ? year : ''}
          </span>
        ))}
      </div>
    </div>
  );
}
