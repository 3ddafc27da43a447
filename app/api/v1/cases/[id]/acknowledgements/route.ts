import { route } from '@/lib/auth/route';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';

export const POST = route(acknowledgeCautions, { status: 201, input: ({ params, body }) => ({ ...Object(body), caseId: params.id }) });
