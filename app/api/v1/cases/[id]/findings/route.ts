import { route } from '@/lib/auth/route';
import { recordFinding } from '@/lib/services/case/record-finding';

export const POST = route(recordFinding, { status: 201, input: ({ params, body }) => ({ ...Object(body), caseId: params.id }) });
