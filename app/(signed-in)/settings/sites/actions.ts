'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { addSite as add } from '@/lib/services/site/add';
import { changeSite as change } from '@/lib/services/site/change';

const LIST = '/settings/sites';

const backToList = () => {
  revalidatePath(LIST);
  redirect(LIST);
};

export const addSite = action(add, { after: backToList });
export const changeSite = action(change, { after: backToList });
