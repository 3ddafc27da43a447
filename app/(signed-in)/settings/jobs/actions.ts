'use server';

import { revalidatePath } from 'next/cache';
import { action } from '@/lib/auth/action';
import { retryJob } from '@/lib/services/job/retry';

export const tryAgain = action(retryJob, { after: () => revalidatePath('/settings/jobs') });
