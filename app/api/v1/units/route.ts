import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { unitList } from '@/lib/openapi/answers/record';
import { browseUnits } from '@/lib/services/unit/browse';
import { createUnit } from '@/lib/services/unit/create';

export const GET = route(browseUnits, { scope: 'units:read', doc: { summary: 'List units', description: 'By fleet number, or those that `q` finds.', answers: unitList } });

export const POST = route(createUnit, { scope: 'units:write', status: 201, doc: { summary: 'Add a unit', answers: idAnswer } });
