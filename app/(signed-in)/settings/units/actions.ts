'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { setUnits } from '@/lib/services/person/set-units';

export const saveUnits = action(setUnits, { after: () => revalidatePath('/', 'layout') });
