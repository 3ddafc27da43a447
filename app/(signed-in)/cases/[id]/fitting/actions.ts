'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { newId } from '@/lib/ids';
import { acknowledgeWork } from '@/lib/services/case/acknowledge-work';
import { answerPoint, finishFitting } from '@/lib/services/fitting/answer';
import { startFitting } from '@/lib/services/fitting/start';

const readAnew = (_result: unknown, { caseId }: Record<string, string | string[]>) => revalidatePath(`/cases/${caseId}`, 'layout');

export const readCautions = action(acknowledgeWork, {
  input: ({ caseId, work, cautions }) => ({ caseId, work, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) }),
  after: readAnew,
});
export const begin = action(startFitting, { after: readAnew });
export const sayOfPoint = action(answerPoint, { after: readAnew });
export const finish = action(finishFitting, { after: readAnew });
