import { revalidatePath } from 'next/cache';
import type { FormFields } from '@/lib/auth/form';
import { newId } from '@/lib/ids';

/** What the actions of a case's pages share. */

/** Every page of the case is drawn anew: what was written on one shows on the others. */
export const readAnew = (_result: unknown, { caseId }: FormFields): void => revalidatePath(`/cases/${caseId}`, 'layout');

/** Cautions that were read, from their form: each becomes a row of its own. */
export const cautionsRead = ({ cautions, ...of }: FormFields) => ({ ...of, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) });
