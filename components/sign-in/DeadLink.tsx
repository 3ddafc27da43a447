import type { ReactNode } from 'react';
import { Doorway } from './Doorway';

/** A mailed link that leads nowhere any more: what happened, and what to do. */
export function DeadLink({ children, action }: { children: ReactNode; action: ReactNode }) {
  return (
    <Doorway>
      <h1>This link doesn’t work</h1>
      <p>{children}</p>
      <div>{action}</div>
    </Doorway>
  );
}
