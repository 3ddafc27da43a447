import { route } from '@/lib/auth/route';
import { recordFinding } from '@/lib/services/case/record-finding';

export const POST = route(recordFinding, { params: { id: 'caseId' }, scope: 'cases:write', status: 201 });
