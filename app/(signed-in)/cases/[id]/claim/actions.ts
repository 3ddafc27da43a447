'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { fileClaim, settleClaim } from '@/lib/services/claim/claim';
import { sendCore, settleCore } from '@/lib/services/claim/core';

const readAnew = (_result: unknown, { caseId }: Record<string, string | string[]>) => revalidatePath(`/cases/${caseId}/claim`);

export const keepClaim = action(fileClaim, { after: readAnew });
export const endClaim = action(settleClaim, { after: readAnew });
export const keepCore = action(sendCore, { after: readAnew });
export const endCore = action(settleCore, { after: readAnew });
