'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { createToken } from '@/lib/services/token/create';
import { revokeToken } from '@/lib/services/token/revoke';

const refreshList = () => revalidatePath('/settings/tokens');

export const makeToken = action(createToken, { after: refreshList });
export const endToken = action(revokeToken, { after: refreshList });
