import { route } from '@/lib/auth/route';
import { readCaseReasons } from '@/lib/services/case/read';

export const GET = route(readCaseReasons, { params: { id: 'caseId' }, scope: 'cases:read' });
