'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { newId } from '@/lib/ids';
import { endBreakIn, lookHot, startBreakIn } from '@/lib/services/break-in/run';
import { acknowledgeWork } from '@/lib/services/case/acknowledge-work';

const readAnew = (_result: unknown, { caseId }: Record<string, string | string[]>) => revalidatePath(`/cases/${caseId}`, 'layout');

export const readCautions = action(acknowledgeWork, {
  input: ({ caseId, work, cautions }) => ({ caseId, work, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) }),
  after: readAnew,
});
export const begin = action(startBreakIn, { after: readAnew });
export const end = action(endBreakIn, { after: readAnew });
export const saveHotCheck = action(lookHot, { after: readAnew });
