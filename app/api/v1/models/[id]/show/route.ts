import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { showModel } from '@/lib/services/compressor-model/hide';

export const POST = route(showModel, { params: { id: 'modelId' }, scope: 'models:write', doc: { summary: 'Put a hidden compressor model back', answers: idAnswer } });
