'use server';

import { action } from '@/lib/auth/action';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { endCatch, remindOfCatch } from '@/lib/services/oil-catch/end';
import { startCatch } from '@/lib/services/oil-catch/start';
import { takeBackWeighing } from '@/lib/services/oil-catch/take-back';
import { weigh } from '@/lib/services/oil-catch/weigh';
import { cautionsRead, readAnew } from '../case-forms';

export const readCautions = action(acknowledgeCautions, { input: cautionsRead, after: readAnew });
export const begin = action(startCatch, { after: readAnew });
export const saveWeighing = action(weigh, { after: readAnew });
export const takeDown = action(endCatch, { after: readAnew });
export const changeReminder = action(remindOfCatch, { after: readAnew });
export const takeBack = action(takeBackWeighing, { after: readAnew });
