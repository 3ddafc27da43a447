import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { withdrawLimit } from '@/lib/services/limit/withdraw';

export const POST = route(withdrawLimit, { params: { id: 'limitId' }, scope: 'limits:write', doc: { summary: 'Withdraw a limit', answers: idAnswer } });
