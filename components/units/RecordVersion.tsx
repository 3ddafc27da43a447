'use client';

import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import type { FormHandle } from '@/components/forms/use-form';

/**
 * Carries along what a form was filled from. After a refusal the page is read anew, so that saving once more is meant
 * against what is stored by then, which the refusal has shown.
 */
export function RecordVersion({ form, version }: { form: FormHandle; version: string }) {
  const router = useRouter();
  const refused = form.message !== undefined;
  useEffect(() => {
    if (refused) router.refresh();
  }, [refused, form.attempt, router]);
  return <input type="hidden" name="version" value={version} readOnly />;
}
