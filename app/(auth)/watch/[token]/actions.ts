'use server';

import { visitorAction } from '@/lib/auth/action';
import { readByLink } from '@/lib/services/watch/by-link';

export const saveReading = visitorAction(readByLink);
