'use server';

import { action } from '@/lib/auth/action';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { recordFinding } from '@/lib/services/case/record-finding';
import { releaseUnit } from '@/lib/services/release/release';
import { cautionsRead, readAnew } from '../case-forms';
import { stageAnswer } from '../stage-answer';

export const readCautions = action(acknowledgeCautions, { input: cautionsRead, after: readAnew });
export const measure = action(recordFinding, { input: stageAnswer, after: readAnew });
export const release = action(releaseUnit, { after: readAnew });
