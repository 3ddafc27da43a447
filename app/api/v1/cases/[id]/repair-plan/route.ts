import { route } from '@/lib/auth/route';
import { repairPlan } from '@/lib/openapi/answers/repair';
import { readRepairPlan } from '@/lib/services/repair/read-plan';

export const GET = route(readRepairPlan, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The repair plan of a case', description: 'Remedies in the order of least expected cost as the case stands now, each with its chance, minutes, parts, cautions and steps. Money is in the organisation’s currency.', answers: repairPlan },
});
