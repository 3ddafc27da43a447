import type { ReactNode } from 'react';

/** Words for a screen reader where the page shows them otherwise. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>;
}
