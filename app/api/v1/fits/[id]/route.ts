import { route } from '@/lib/auth/route';
import { fitAnswer, fitWritten } from '@/lib/openapi/answers/record';
import { changeFit } from '@/lib/services/fit/change';
import { viewFit } from '@/lib/services/fit/view';

const params = { id: 'fitId' };

export const GET = route(viewFit, {
  params,
  scope: 'units:read',
  version: ({ version }) => version,
  shape: ({ fit, values }) => ({ ...fit, values }),
  doc: { summary: 'Read a fit', answers: fitAnswer },
});

export const PUT = route(changeFit, {
  params,
  scope: 'units:write',
  ifMatch: 'needed',
  doc: { summary: 'Correct a fit', description: 'As a whole: what is left out is not known any more. `values` of the fit is what to begin with.', answers: fitWritten },
});
