'use server';

import { action } from '@/lib/auth/action';
import { acknowledgeWork } from '@/lib/services/case/acknowledge-work';
import { answerPoint, finishFitting } from '@/lib/services/fitting/answer';
import { startFitting } from '@/lib/services/fitting/start';
import { cautionsRead, readAnew } from '../case-forms';

export const readCautions = action(acknowledgeWork, { input: cautionsRead, after: readAnew });
export const begin = action(startFitting, { after: readAnew });
export const sayOfPoint = action(answerPoint, { after: readAnew });
export const finish = action(finishFitting, { after: readAnew });
