import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { markStep } from '@/lib/services/repair/work';

export const POST = route(markStep, {
  params: { id: 'caseId', repairId: 'repairId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Say what was done of a step', description: 'By its place, from 0. The last word on a step holds; its cautions have to be acknowledged today.', answers: repairWritten },
});
