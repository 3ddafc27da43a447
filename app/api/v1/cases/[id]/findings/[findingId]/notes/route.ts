import { route } from '@/lib/auth/route';
import { noteFinding } from '@/lib/services/case/note-finding';

export const POST = route(noteFinding, { params: { id: 'caseId' }, scope: 'cases:write', status: 201 });
