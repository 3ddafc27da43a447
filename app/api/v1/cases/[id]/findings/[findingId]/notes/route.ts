import { route } from '@/lib/auth/route';
import { noted } from '@/lib/openapi/answers/case';
import { noteFinding } from '@/lib/services/case/note-finding';

export const POST = route(noteFinding, { params: { id: 'caseId' }, scope: 'cases:write', status: 201, doc: { summary: 'Put a note beside a finding', answers: noted } });
