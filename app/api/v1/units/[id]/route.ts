import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { unitAnswer } from '@/lib/openapi/answers/record';
import { changeUnit } from '@/lib/services/unit/change';
import { viewUnit } from '@/lib/services/unit/view';

const params = { id: 'unitId' };

export const GET = route(viewUnit, {
  params,
  scope: 'units:read',
  version: ({ version }) => version,
  shape: ({ unit, values }) => ({ ...unit, values }),
  doc: { summary: 'Read a unit', answers: unitAnswer },
});

export const PUT = route(changeUnit, {
  params,
  scope: 'units:write',
  ifMatch: 'needed',
  doc: { summary: 'Change a unit', description: 'As a whole: what is left out is not known any more. `values` of the unit is what to begin with.', answers: idAnswer },
});
