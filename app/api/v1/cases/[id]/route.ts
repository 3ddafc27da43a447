import { route } from '@/lib/auth/route';
import { readCaseState } from '@/lib/services/case/read';

export const GET = route(readCaseState, { input: ({ params, query }) => ({ ...query, caseId: params.id }) });
