'use client';

import { Fragment, type ReactNode } from 'react';
import { FormErrorSummary } from '@/components/ui/FormErrorSummary';
import { Notice } from '@/components/ui/Notice';
import { classes } from '@/components/ui/classes';
import type { FormHandle } from './use-form';

interface Props {
  form: FormHandle;
  children: ReactNode;
  /** Said when it worked and the page stays. */
  saved?: ReactNode;
  /** Over the errors; "Not saved yet" unless given. */
  errorTitle?: string;
  /** Names the form where a page has several. */
  label?: string;
  className?: string;
}

/** The frame of a form: what stopped it at its head, then its fields. */
export function Form({ form, children, saved, errorTitle, label, className }: Props) {
  return (
    <form action={form.submit} noValidate aria-label={label} className={classes('grid max-w-prose gap-6 sm:[&>button]:justify-self-start', className)}>
      <FormErrorSummary errors={form.errors} formError={form.message} title={errorTitle} />
      {form.saved && saved && <Notice kind="saved">{saved}</Notice>}
      <Fragment key={form.attempt}>{children}</Fragment>
    </form>
  );
}
