'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { makeDossierAgain } from '@/lib/services/dossier/again';
import { makeDossier } from '@/lib/services/dossier/make';
import { sendDossier, sendDossierAgain } from '@/lib/services/dossier/send';

const readAnew = (_result: unknown, { caseId }: Record<string, string | string[]>) => revalidatePath(`/cases/${caseId}/dossier`);

export const make = action(makeDossier, { after: readAnew });
export const makeAgain = action(makeDossierAgain, { after: readAnew });
export const send = action(sendDossier, { after: readAnew });
export const sendAgain = action(sendDossierAgain, { after: readAnew });
