'use client';

import { lazy, Suspense, useSyncExternalStore, type ComponentType } from 'react';
import type { LinePlotProps } from './LinePlot';

// The chart library comes with the first plot that is shown, and not before. Where it can't be fetched, words and table do.
const LinePlot = lazy<ComponentType<LinePlotProps>>(() => import('./LinePlot').catch(() => ({ default: () => null })));

const never = () => () => undefined;

/** A plot, or its place: a canvas is drawn in the browser alone; its place, its words and its table are there before. */
export function PlotInPlace({ drawn }: { drawn: LinePlotProps | false | null | undefined }) {
  const inBrowser = useSyncExternalStore(never, () => true, () => false);
  return (
    <div className="h-80" aria-hidden="true">
      {drawn && inBrowser && <Suspense fallback={null}><LinePlot {...drawn} /></Suspense>}
    </div>
  );
}
