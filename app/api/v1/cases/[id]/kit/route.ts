import { route } from '@/lib/auth/route';
import { readCaseKit } from '@/lib/services/case/kit';

export const GET = route(readCaseKit, { input: ({ params, query }) => ({ ...query, caseId: params.id }) });
