'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { adoptLimit as adopt } from '@/lib/services/limit/adopt';
import { withdrawLimit as withdraw } from '@/lib/services/limit/withdraw';

const LIST = '/settings/limits';

const backToList = () => {
  revalidatePath(LIST);
  redirect(LIST);
};

export const adoptLimit = action(adopt, { after: backToList });
export const withdrawLimit = action(withdraw, { after: backToList });
