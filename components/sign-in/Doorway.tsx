import type { ReactNode } from 'react';
import { OilPathDrawing } from '@/components/oil-path/OilPathDrawing';

/** The pages in front of the application: what has to be done, beside the path that it is all about. */
export function Doorway({ children }: { children: ReactNode }) {
  return (
    <div className="grid items-start gap-x-16 py-10 lg:grid-cols-[minmax(0,27rem)_minmax(0,1fr)]">
      <div className="grid w-full max-w-md gap-8 max-lg:mx-auto">{children}</div>
      <div className="border-l border-rule pl-16 max-lg:hidden print:hidden">
        <OilPathDrawing className="h-auto w-full" />
      </div>
    </div>
  );
}
