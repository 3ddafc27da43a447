'use server';

import { action } from '@/lib/auth/action';
import { makeDossierAgain } from '@/lib/services/dossier/again';
import { makeDossier } from '@/lib/services/dossier/make';
import { sendDossier, sendDossierAgain } from '@/lib/services/dossier/send';
import { readAnew } from '../case-forms';

export const make = action(makeDossier, { after: readAnew });
export const makeAgain = action(makeDossierAgain, { after: readAnew });
export const send = action(sendDossier, { after: readAnew });
export const sendAgain = action(sendDossierAgain, { after: readAnew });
