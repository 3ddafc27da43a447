import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { endRepair } from '@/lib/services/repair/work';

export const POST = route(endRepair, {
  params: { id: 'caseId', repairId: 'repairId' },
  scope: 'cases:write',
  doc: { summary: 'Finish a repair, or drop it', description: 'Done when every step was done or doesn’t apply; dropped with why.', answers: repairWritten },
});
