'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { newId } from '@/lib/ids';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';

export const readRepairCautions = action(acknowledgeRepair, {
  input: ({ caseId, remedyId, cautions }) => ({ caseId, remedyId, cautions: [cautions ?? []].flat().map((cautionId) => ({ id: newId(), cautionId })) }),
  after: (_result, { caseId }) => revalidatePath(`/cases/${caseId}`, 'layout'),
});
