import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { limitList } from '@/lib/openapi/answers/limit';
import { adoptLimit } from '@/lib/services/limit/adopt';
import { browseLimits } from '@/lib/services/limit/list';

export const GET = route(browseLimits, {
  scope: 'limits:read',
  doc: { summary: 'List limits', description: 'Those that your organisation adopted and that stand, in the order of adoption.', answers: limitList },
});

export const POST = route(adoptLimit, { scope: 'limits:write', status: 201, doc: { summary: 'Adopt a limit', answers: idAnswer } });
