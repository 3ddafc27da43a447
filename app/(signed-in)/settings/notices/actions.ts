'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { setNotices } from '@/lib/services/notice/choices';

export const saveNotices = action(setNotices, { after: () => revalidatePath('/settings/notices') });
