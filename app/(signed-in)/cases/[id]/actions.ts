'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { assignCase } from '@/lib/services/case/assign';
import { callCause } from '@/lib/services/case/call';
import { reopenCase } from '@/lib/services/case/reopen';

/** A field that was left empty says nothing. */
const filled = (fields: Record<string, string | string[]>) => Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== ''));

export const callFromForm = action(callCause, {
  input: (fields) => ({ ...filled(fields), contributingCauses: [fields.contributingCauses ?? []].flat() }),
  after: (_result, { caseId }) => revalidatePath(`/cases/${caseId}`),
});

export const reopenFromForm = action(reopenCase, {
  input: filled,
  after: (_result, { caseId }) => revalidatePath(`/cases/${caseId}`),
});

export const assignFromForm = action(assignCase, {
  input: ({ caseId, personId }) => ({ caseId, personId: personId || null }),
  after: (_result, { caseId }) => revalidatePath(`/cases/${caseId}`),
});
