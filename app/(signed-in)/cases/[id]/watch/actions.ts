'use server';

import { action } from '@/lib/auth/action';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { endWatch } from '@/lib/services/watch/end';
import { createWatchLink, revokeWatchLink } from '@/lib/services/watch/links';
import { addWatchReading, takeBackWatchReading } from '@/lib/services/watch/readings';
import { startWatch } from '@/lib/services/watch/start';
import { cautionsRead, readAnew } from '../case-forms';

export const readCautions = action(acknowledgeCautions, { input: cautionsRead, after: readAnew });
/** Fields are named as the input is: "begin.0.answer". */
export const beginWatch = action(startWatch, {
  input: (fields) => {
    const { id, caseId, odometer } = fields;
    const count = Object.keys(fields).filter((name) => /^begin\.\d+\.why$/.test(name)).length;
    return { id, caseId, odometer, begin: Array.from({ length: count }, (_, i) => ({ answer: fields[`begin.${i}.answer`], why: fields[`begin.${i}.why`] })) };
  },
  after: readAnew,
});
export const saveReading = action(addWatchReading, { after: readAnew });
export const takeBack = action(takeBackWatchReading, { after: readAnew });
export const makeLink = action(createWatchLink, { after: readAnew });
export const takeLinkBack = action(revokeWatchLink, { after: readAnew });
export const endIt = action(endWatch, { after: readAnew });
