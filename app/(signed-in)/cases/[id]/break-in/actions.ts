'use server';

import { action } from '@/lib/auth/action';
import { endBreakIn, lookHot, startBreakIn } from '@/lib/services/break-in/run';
import { acknowledgeWork } from '@/lib/services/case/acknowledge-work';
import { cautionsRead, readAnew } from '../case-forms';

export const readCautions = action(acknowledgeWork, { input: cautionsRead, after: readAnew });
export const begin = action(startBreakIn, { after: readAnew });
export const end = action(endBreakIn, { after: readAnew });
export const saveHotCheck = action(lookHot, { after: readAnew });
