import { route } from '@/lib/auth/route';
import { gateOutcome } from '@/lib/openapi/answers/gate';
import { readGateOutcome } from '@/lib/services/gate/outcome';

export const GET = route(readGateOutcome, {
  scope: 'fleet:read',
  doc: { summary: 'Compare gated and ungated fits', description: 'How many came back within 90 days and how many had a claim paid. Workshops chose when to use the gate; it is not a trial.', answers: gateOutcome },
});
