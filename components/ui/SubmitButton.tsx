'use client';

import type { ComponentProps } from 'react';
import { useFormStatus } from 'react-dom';
import { Button } from './Button';

/**
 * Sends the form around it. While it is on its way the label says so and a second press does nothing;
 * the button keeps the focus (a disabled one would drop it).
 * @example <SubmitButton pendingLabel="Opening…">Open the case</SubmitButton>
 */
export function SubmitButton({ pendingLabel = 'Saving…', children, onClick, ...rest }: ComponentProps<typeof Button> & { pendingLabel?: string }) {
  const { pending } = useFormStatus();
  return (
    <Button
      {...rest}
      type="submit"
      aria-disabled={pending || undefined}
      onClick={(event) => (pending ? event.preventDefault() : onClick?.(event))}
    >
      {pending ? pendingLabel : children}
    </Button>
  );
}
