import { route } from '@/lib/auth/route';
import { acknowledged } from '@/lib/openapi/answers/case';
import { acknowledgeWork } from '@/lib/services/case/acknowledge-work';

export const POST = route(acknowledgeWork, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  doc: { summary: 'Acknowledge the cautions of a fitting or a break-in run', description: 'For today, and for the danger that the work is.', answers: acknowledged },
});
