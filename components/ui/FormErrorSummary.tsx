'use client';

import { useEffect, useRef } from 'react';
import type { FieldErrorText } from './field';

interface Props {
  /** Errors by field name (which is the field's id). */
  errors?: Record<string, FieldErrorText>;
  /** What is wrong with the whole, such as "The address or the password is wrong." */
  formError?: string;
  title?: string;
}

/**
 * What stopped a form, at its head. Takes the focus when it appears and at each new set of errors,
 * and each line leads to its field. Renders nothing when all is well.
 * @example <FormErrorSummary errors={state.fieldErrors} formError={state.message} />
 */
export function FormErrorSummary({ errors = {}, formError, title = 'Not saved yet' }: Props) {
  const box = useRef<HTMLDivElement>(null);
  const lines = Object.entries(errors).flatMap(([name, error]) => {
    const messages = Array.isArray(error) ? error : error ? [error] : [];
    return messages.map((message) => ({ name, message }));
  });
  const shown = lines.length > 0 || Boolean(formError);

  useEffect(() => {
    if (shown) box.current?.focus();
  }, [shown, errors, formError]);

  if (!shown) return null;
  return (
    <div ref={box} role="alert" tabIndex={-1} className="border-l-8 border-danger bg-danger-ground px-5 py-4">
      <h2 className="text-xl text-danger">{title}</h2>
      {formError && <p className="mt-1">{formError}</p>}
      {lines.length > 0 && (
        <ul className="mt-1">
          {lines.map(({ name, message }) => (
            <li key={name + message}>
              <a className="inline-block py-1 underline underline-offset-4" href={`#${name}`}>{message}</a>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
