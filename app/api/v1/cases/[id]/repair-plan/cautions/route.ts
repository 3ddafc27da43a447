import { route } from '@/lib/auth/route';
import { acknowledged } from '@/lib/openapi/answers/case';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';

export const POST = route(acknowledgeRepair, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  doc: { summary: 'Acknowledge the cautions of a repair', description: 'For today, and for a system that is opened.', answers: acknowledged },
});
