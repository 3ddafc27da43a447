import type { FieldErrorText } from './field';

/** What is wrong with a field, under it. Renders nothing without an error. */
export function FieldError({ id, error }: { id: string; error: FieldErrorText }) {
  const messages = Array.isArray(error) ? error : error ? [error] : [];
  if (messages.length === 0) return null;
  return (
    <p id={id} className="flex gap-2 font-bold text-danger">
      <span aria-hidden="true" className="figure grid size-6 shrink-0 place-items-center rounded-full border-2 border-danger text-sm leading-none">!</span>
      <span>{messages.join(' ')}</span>
    </p>
  );
}
