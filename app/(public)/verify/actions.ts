'use server';

import { visitorAction } from '@/lib/auth/action';
import { verifyDossier } from '@/lib/services/dossier/verify';

export const verify = visitorAction(verifyDossier);
