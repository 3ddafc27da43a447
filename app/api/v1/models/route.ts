import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { modelList } from '@/lib/openapi/answers/record';
import { browseModels } from '@/lib/services/compressor-model/browse';
import { createModel } from '@/lib/services/compressor-model/create';

export const GET = route(browseModels, { scope: 'models:read', doc: { summary: 'List compressor models', answers: modelList } });

export const POST = route(createModel, { scope: 'models:write', status: 201, doc: { summary: 'Add a compressor model', answers: idAnswer } });
