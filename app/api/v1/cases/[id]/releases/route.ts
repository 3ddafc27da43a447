import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { releaseUnit } from '@/lib/services/release/release';

export const POST = route(releaseUnit, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Release the unit', description: 'By whoever may. Refused while a required check is missing or out, and says which. “Do not release” that has passed is lifted with it.', answers: repairWritten },
});
