import type { ReactNode } from 'react';
import { OilPathMark } from '@/components/oil-path/OilPathMark';

/**
 * Nothing here, and what to do about it.
 * @example <EmptyState title="No open case" action={<ButtonLink href="/cases/new">Open a case</ButtonLink>}>Cases that wait for you stand here.</EmptyState>
 */
export function EmptyState({ title, children, action }: { title: ReactNode; children?: ReactNode; action?: ReactNode }) {
  return (
    <div className="flex flex-wrap gap-x-8 gap-y-5 border-b border-rule pt-4 pb-10">
      <OilPathMark className="size-20 shrink-0" />
      <div className="min-w-0 flex-1 basis-64">
        <p className="heading text-2xl">{title}</p>
        {children && <div className="mt-2 max-w-prose text-ink-soft">{children}</div>}
        {action && <div className="mt-5 flex flex-wrap gap-3">{action}</div>}
      </div>
    </div>
  );
}
