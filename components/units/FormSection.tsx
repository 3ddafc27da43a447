import type { ReactNode } from 'react';

/** Fields that belong together, under a heading of their own; side by side where there is room. The first of a page has its rule from the page's head. */
export function FormSection({ title, hint, children }: { title: string; hint?: ReactNode; children: ReactNode }) {
  return (
    <fieldset className="grid min-w-0 gap-5 border-t border-ink pt-4 [[type=hidden]+&]:border-t-0 [[type=hidden]+&]:pt-0">
      <legend className="heading float-left mb-1 w-full text-xl">{title}</legend>
      {hint && <p className="-mt-4 text-ink-soft">{hint}</p>}
      <div className="form-grid">{children}</div>
    </fieldset>
  );
}
