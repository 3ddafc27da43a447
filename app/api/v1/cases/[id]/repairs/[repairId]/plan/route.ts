import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { planRepair } from '@/lib/services/repair/work';

export const POST = route(planRepair, {
  params: { id: 'caseId', repairId: 'repairId' },
  scope: 'cases:write',
  doc: { summary: 'Say when a repair is planned, and who does it', description: 'Both as they are from now on; what is left out is nobody’s and on no day.', answers: repairWritten },
});
