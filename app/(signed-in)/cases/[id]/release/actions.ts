'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { newId } from '@/lib/ids';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { recordFinding } from '@/lib/services/case/record-finding';
import { releaseUnit } from '@/lib/services/release/release';
import { stageAnswer } from '../stage-answer';

const readAnew = (_result: unknown, { caseId }: Record<string, string | string[]>) => revalidatePath(`/cases/${caseId}`, 'layout');

export const readCautions = action(acknowledgeCautions, {
  input: ({ caseId, checkId, cautions }) => ({ caseId, checkId, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) }),
  after: readAnew,
});
export const measure = action(recordFinding, { input: stageAnswer, after: readAnew });
export const release = action(releaseUnit, { after: readAnew });
