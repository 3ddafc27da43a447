import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { showUnit } from '@/lib/services/unit/hide';

export const POST = route(showUnit, { params: { id: 'unitId' }, scope: 'units:write', doc: { summary: 'Put a hidden unit back', answers: idAnswer } });
