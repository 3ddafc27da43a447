import { route } from '@/lib/auth/route';
import { fitWritten } from '@/lib/openapi/answers/record';
import { hideFit } from '@/lib/services/fit/hide';

export const POST = route(hideFit, { params: { id: 'fitId' }, scope: 'units:write', doc: { summary: 'Strike out a fit entered by mistake', answers: fitWritten } });
