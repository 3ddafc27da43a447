import type { ReactNode } from 'react';
import { classes } from '@/components/ui/classes';
import type { Shape } from './shape';

/**
 * The outline of a page in the places where its parts will stand, so that nothing moves when they come. It is as high as
 * the screen, which keeps the foot of the page out of sight until then.
 */
export function Skeleton({ shape, what }: { shape: Shape; what: string }) {
  return (
    <div className="appear-late min-h-dvh">
      <p role="status" className="sr-only">Fetching {what}…</p>
      <div aria-hidden="true">
        <div className="rule-double mb-8 grid gap-3 border-rule! pb-4">
          <Bar className="h-10 w-52" />
          <Bar className="h-5 w-full max-w-96" />
        </div>
        {PARTS[shape]}
      </div>
    </div>
  );
}

const Bar = ({ className }: { className?: string }) => <span className={classes('block bg-sunk', className)} />;

const times = (count: number, part: (index: number) => ReactNode) => Array.from({ length: count }, (_, index) => part(index));

const rows = (count: number) => times(count, (row) => (
  <div key={row} className="grid grid-cols-[8rem_1fr_1fr_4rem] gap-6 border-b border-rule py-5 max-sm:grid-cols-[1fr_2fr]">
    <Bar className="h-6" />
    <Bar className="h-6" />
    <Bar className="h-6 max-sm:hidden" />
    <Bar className="h-6 max-sm:hidden" />
  </div>
));

const PARTS: Record<Shape, ReactNode> = {
  list: (
    <>
      <div className="mb-8 flex flex-wrap gap-4">{times(3, (field) => <Bar key={field} className="h-12 w-44 max-sm:w-full" />)}</div>
      <div className="border-t-2 border-rule">{rows(8)}</div>
    </>
  ),
  record: (
    <div className="grid gap-14 lg:grid-cols-[3fr_2fr]">
      <div className="grid content-start gap-4">
        <Bar className="h-7 w-40" />
        <Bar className="h-40" />
        {rows(3)}
      </div>
      <div className="grid content-start gap-4">
        <Bar className="h-7 w-32" />
        {times(8, (fact) => <Bar key={fact} className="h-6" />)}
      </div>
    </div>
  ),
  form: (
    <div className="grid max-w-prose gap-6">
      {times(4, (field) => (
        <div key={field} className="grid gap-2">
          <Bar className="h-4 w-36" />
          <Bar className="h-12" />
        </div>
      ))}
      <Bar className="h-12 w-32" />
    </div>
  ),
  case: (
    <div className="grid gap-8">
      <Bar className="h-44" />
      <div className="grid gap-8 lg:grid-cols-[1fr_26rem]">
        <div className="grid content-start gap-4">
          <Bar className="h-8 w-64" />
          {times(3, (answer) => <Bar key={answer} className="h-14" />)}
        </div>
        <div className="grid content-start gap-3">{times(6, (cause) => <Bar key={cause} className="h-14" />)}</div>
      </div>
    </div>
  ),
  history: (
    <div className="grid gap-8">
      <Bar className="h-20" />
      <div className="grid gap-3">{times(8, (cause) => <Bar key={cause} className="h-10" />)}</div>
    </div>
  ),
};
