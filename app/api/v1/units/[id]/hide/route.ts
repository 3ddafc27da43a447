import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { hideUnit } from '@/lib/services/unit/hide';

export const POST = route(hideUnit, { params: { id: 'unitId' }, scope: 'units:write', doc: { summary: 'Take a unit out of the lists', answers: idAnswer } });
