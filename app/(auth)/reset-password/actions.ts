'use server';

import { visitorAction } from '@/lib/auth/action';
import { requestPasswordReset } from '@/lib/services/password/request-reset';
import { resetPassword } from '@/lib/services/password/reset';

export const requestReset = visitorAction(requestPasswordReset);

export const reset = visitorAction(resetPassword);
