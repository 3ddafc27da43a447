'use server';

import { action } from '@/lib/auth/action';
import { fileClaim, settleClaim } from '@/lib/services/claim/claim';
import { sendCore, settleCore } from '@/lib/services/claim/core';
import { readAnew } from '../case-forms';

export const keepClaim = action(fileClaim, { after: readAnew });
export const endClaim = action(settleClaim, { after: readAnew });
export const keepCore = action(sendCore, { after: readAnew });
export const endCore = action(settleCore, { after: readAnew });
