import { route } from '@/lib/auth/route';
import { casesToKeepAnswer } from '@/lib/openapi/answers/device';
import { casesToKeep } from '@/lib/services/device/cases';

export const GET = route(casesToKeep, { scope: 'cases:read', doc: { summary: 'List the open cases that a device should keep', answers: casesToKeepAnswer } });
