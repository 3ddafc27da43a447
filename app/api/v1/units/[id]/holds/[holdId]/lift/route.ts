import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { liftHold } from '@/lib/services/unit-hold/lift';

export const POST = route(liftHold, {
  params: { id: 'unitId', holdId: 'holdId' },
  scope: 'units:write',
  doc: {
    summary: 'Lift “do not release”',
    description: 'By somebody with that right. `found` is the value as measured now, or what was seen where the check is not measured and has passed as an answer.',
    answers: idAnswer,
  },
});
