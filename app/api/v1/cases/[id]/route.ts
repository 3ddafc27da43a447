import { route } from '@/lib/auth/route';
import { readCaseState } from '@/lib/services/case/read';

export const GET = route(readCaseState, { params: { id: 'caseId' }, scope: 'cases:read', version: ({ version }) => version });
