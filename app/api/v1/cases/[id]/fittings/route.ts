import { route } from '@/lib/auth/route';
import { fittingList, fittingStarted } from '@/lib/openapi/answers/fitting';
import { listFittings } from '@/lib/services/fitting/list';
import { startFitting } from '@/lib/services/fitting/start';

export const GET = route(listFittings, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The compressors fitted in a case', description: 'Each with its install record: every point, its answers, and what was last said of it.', answers: fittingList },
});

export const POST = route(startFitting, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Begin to fit a compressor', description: 'It is on the unit’s record from now, by the id `newFitId`; `previousWhyOut` says why the one before comes off. The cautions of a fitting have to be acknowledged today.', answers: fittingStarted },
});
