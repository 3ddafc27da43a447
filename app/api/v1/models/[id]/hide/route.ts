import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { hideModel } from '@/lib/services/compressor-model/hide';

export const POST = route(hideModel, { params: { id: 'modelId' }, scope: 'models:write', doc: { summary: 'Take a compressor model out of the lists', answers: idAnswer } });
