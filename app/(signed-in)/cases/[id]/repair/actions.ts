'use server';

import { action } from '@/lib/auth/action';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { recordFinding } from '@/lib/services/case/record-finding';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { chooseRepair } from '@/lib/services/repair/choose';
import { endRepair, markStep, planRepair } from '@/lib/services/repair/work';
import { cautionsRead, readAnew } from '../case-forms';
import { stageAnswer } from '../stage-answer';

export const readRepairCautions = action(acknowledgeRepair, { input: cautionsRead, after: readAnew });
export const readCheckCautions = action(acknowledgeCautions, { input: cautionsRead, after: readAnew });
export const see = action(recordFinding, { input: stageAnswer, after: readAnew });
export const choose = action(chooseRepair, { after: readAnew });
export const planIt = action(planRepair, { after: readAnew });
export const saySo = action(markStep, { after: readAnew });
export const endIt = action(endRepair, { after: readAnew });
