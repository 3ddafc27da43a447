'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { changeOrganisation } from '@/lib/services/organisation/change';

export const saveOrganisation = action(changeOrganisation, { after: () => revalidatePath('/', 'layout') });
