import Link from 'next/link';
import type { ComponentProps } from 'react';
import { classes } from './classes';

/** None is red: red is kept for danger to people, and what is hard to undo says so in words. */
export type ButtonVariant = 'primary' | 'quiet';
/** `touch` is 48 px high and more, for gloves; `small` only where a mouse is at hand (tables, toolbars). */
export type ButtonSize = 'touch' | 'small';

interface Look {
  variant?: ButtonVariant;
  size?: ButtonSize;
  /** Takes the whole width on a phone. */
  wide?: boolean;
}

const variants: Record<ButtonVariant, string> = {
  primary: 'bg-ink text-paper border-ink hover:bg-ink-soft hover:border-ink-soft disabled:border-edge disabled:border-dashed disabled:bg-transparent disabled:text-ink-soft',
  quiet: 'bg-transparent text-ink border-edge hover:border-ink hover:bg-sunk disabled:border-dashed disabled:border-edge disabled:bg-transparent disabled:text-ink-soft',
};
const sizes: Record<ButtonSize, string> = {
  touch: 'min-h-touch px-5 py-2.5 text-[1.0625rem]',
  small: 'min-h-9 px-3 py-1 text-[0.9375rem]',
};

export function buttonClass({ variant = 'primary', size = 'touch', wide = false }: Look = {}): string {
  return classes(
    'inline-flex print:hidden items-center justify-center gap-2 rounded border font-heading font-semibold font-stretch-[80%] [word-spacing:0.12em] leading-tight no-underline text-center',
    variants[variant],
    sizes[size],
    wide && 'w-full sm:w-auto',
  );
}

/**
 * A button. It is `type="button"` unless told otherwise; for a form use `SubmitButton`.
 * @example <Button variant="quiet" size="small">Undo</Button>
 */
export function Button({ variant, size, wide, className, type = 'button', ...rest }: ComponentProps<'button'> & Look) {
  return <button type={type} className={classes(buttonClass({ variant, size, wide }), className)} {...rest} />;
}

/**
 * A link that looks like a button: goes somewhere, changes nothing.
 * @example <ButtonLink href="/cases/new">Open a case</ButtonLink>
 */
export function ButtonLink({ variant, size, wide, className, ...rest }: ComponentProps<typeof Link> & Look) {
  return <Link className={classes(buttonClass({ variant, size, wide }), className)} {...rest} />;
}
