import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { modelAnswer } from '@/lib/openapi/answers/record';
import { changeModel } from '@/lib/services/compressor-model/change';
import { viewModel } from '@/lib/services/compressor-model/view';

const params = { id: 'modelId' };

export const GET = route(viewModel, {
  params,
  scope: 'models:read',
  version: ({ version }) => version,
  shape: ({ model, values }) => ({ ...model, values }),
  doc: { summary: 'Read a compressor model', answers: modelAnswer },
});

export const PUT = route(changeModel, {
  params,
  scope: 'models:write',
  ifMatch: 'needed',
  doc: { summary: 'Change a compressor model', description: 'As a whole: what is left out is not known any more. `values` of the model is what to begin with.', answers: idAnswer },
});
