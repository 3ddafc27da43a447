import { route } from '@/lib/auth/route';
import { fitList, fitWritten } from '@/lib/openapi/answers/record';
import { createFit } from '@/lib/services/fit/create';
import { browseFits } from '@/lib/services/unit/browse-of-unit';

const params = { id: 'unitId' };

export const GET = route(browseFits, { params, scope: 'units:read', doc: { summary: 'List the fits of a unit', description: 'By the day on which they were fitted.', answers: fitList } });

export const POST = route(createFit, {
  params,
  scope: 'units:write',
  status: 201,
  doc: { summary: 'Record a fit', description: 'With `previousWhyOut`, the compressor that is on the unit comes out for it.', answers: fitWritten },
});
