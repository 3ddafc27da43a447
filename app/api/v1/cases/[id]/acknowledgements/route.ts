import { route } from '@/lib/auth/route';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';

export const POST = route(acknowledgeCautions, { params: { id: 'caseId' }, scope: 'cases:write', status: 201 });
