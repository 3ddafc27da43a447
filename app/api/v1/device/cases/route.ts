import { route } from '@/lib/auth/route';
import { casesToKeep } from '@/lib/services/device/cases';

export const GET = route(casesToKeep);
