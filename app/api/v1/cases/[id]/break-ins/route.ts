import { route } from '@/lib/auth/route';
import { breakInList } from '@/lib/openapi/answers/fitting';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { readBreakIn } from '@/lib/services/break-in/read';
import { startBreakIn } from '@/lib/services/break-in/run';

export const GET = route(readBreakIn, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The break-in runs of a case', description: 'With the figures by which one begun now would go: the compressor model’s own, or the edition’s.', answers: breakInList },
});

export const POST = route(startBreakIn, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Begin a break-in run', description: 'Of the compressor fitted in this case, else of the one on the unit. Its cautions have to be acknowledged today.', answers: repairWritten },
});
