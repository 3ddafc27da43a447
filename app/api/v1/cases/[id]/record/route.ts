import { route } from '@/lib/auth/route';
import { caseRecord } from '@/lib/openapi/answers/case';
import { readCase } from '@/lib/services/case/read';

export const GET = route(readCase, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  shape: ({ head, assignedTo, calls, events, moments, usual, catching, watching, otherHolds }) => ({
    head,
    assignedTo,
    calls,
    events: events.map(({ id, kind, reason, person, at }) => ({ id, kind, reason, person, at })),
    moments,
    usual,
    catching,
    watching,
    otherHolds,
  }),
  doc: { summary: 'Read the record of a case', description: 'Unit and complaint, whose it is, calls and what happened when.', answers: caseRecord },
});
