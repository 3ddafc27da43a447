import type { ReactNode } from 'react';

/**
 * Says changes aloud, politely. Keep it on the page from the start and change what is inside:
 * a region that arrives together with its words is often not read.
 * @example <LiveRegion>{movement}</LiveRegion>
 */
export function LiveRegion({ children, visible = false }: { children: ReactNode; visible?: boolean }) {
  return (
    <div role="status" aria-live="polite" aria-atomic="true" className={visible ? undefined : 'sr-only'}>
      {children}
    </div>
  );
}
