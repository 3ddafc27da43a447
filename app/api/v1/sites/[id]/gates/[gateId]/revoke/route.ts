import { route } from '@/lib/auth/route';
import { gateWritten } from '@/lib/openapi/answers/gate';
import { revokeGate } from '@/lib/services/gate/links';

export const POST = route(revokeGate, { params: { id: 'siteId', gateId: 'gateId' }, scope: 'sites:write', doc: { summary: 'Revoke a gate', answers: gateWritten } });
