import { route } from '@/lib/auth/route';
import { nothing } from '@/lib/openapi/answers/record';
import { setUnits } from '@/lib/services/person/set-units';

export const PUT = route(setUnits, {
  scope: 'profile:write',
  input: ({ body }) => body,
  shape: () => ({}),
  doc: { summary: 'Choose your units of measure', description: 'A unit by quantity; those left out are the usual ones of the organisation’s country.', answers: nothing },
});
