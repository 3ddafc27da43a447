'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { newId } from '@/lib/ids';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { recordFinding } from '@/lib/services/case/record-finding';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { chooseRepair } from '@/lib/services/repair/choose';
import { endRepair, markStep, planRepair } from '@/lib/services/repair/work';
import { stageAnswer } from '../stage-answer';

const readAnew = (_result: unknown, { caseId }: Record<string, string | string[]>) => revalidatePath(`/cases/${caseId}`, 'layout');

export const readRepairCautions = action(acknowledgeRepair, {
  input: ({ caseId, remedyId, cautions }) => ({ caseId, remedyId, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) }),
  after: readAnew,
});
export const readCheckCautions = action(acknowledgeCautions, {
  input: ({ caseId, checkId, cautions }) => ({ caseId, checkId, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) }),
  after: readAnew,
});
export const see = action(recordFinding, { input: stageAnswer, after: readAnew });
export const choose = action(chooseRepair, { after: readAnew });
export const planIt = action(planRepair, { after: readAnew });
export const saySo = action(markStep, { after: readAnew });
export const endIt = action(endRepair, { after: readAnew });
