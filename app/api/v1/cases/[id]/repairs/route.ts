import { route } from '@/lib/auth/route';
import { repairList, repairWritten } from '@/lib/openapi/answers/repair';
import { chooseRepair } from '@/lib/services/repair/choose';
import { listRepairs } from '@/lib/services/repair/list';

export const GET = route(listRepairs, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The repairs of a case', description: 'What was chosen, with what was last said of each step.', answers: repairList },
});

export const POST = route(chooseRepair, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Choose a repair', description: 'One that the plan doesn’t have first needs `whyBefore`.', answers: repairWritten },
});
