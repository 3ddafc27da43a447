import type { ReactNode } from 'react';

/** A mailed link that leads nowhere any more: what happened, and what to do. */
export function DeadLink({ children, action }: { children: ReactNode; action: ReactNode }) {
  return (
    <div className="mx-auto grid max-w-md justify-items-start gap-6 py-10">
      <h1>This link is used up</h1>
      <p>{children}</p>
      {action}
    </div>
  );
}
