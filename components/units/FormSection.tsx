import type { ReactNode } from 'react';

/** Fields that belong together, under a heading of their own; side by side where there is room. */
export function FormSection({ title, hint, children }: { title: string; hint?: ReactNode; children: ReactNode }) {
  return (
    <fieldset className="grid min-w-0 gap-5 border-t border-ink pt-4">
      <legend className="heading float-left mb-1 w-full text-xl">{title}</legend>
      {hint && <p className="-mt-4 text-ink-soft">{hint}</p>}
      <div className="grid items-start gap-x-8 gap-y-5 sm:grid-cols-2">{children}</div>
    </fieldset>
  );
}
