import { route } from '@/lib/auth/route';
import { claimList, claimWritten } from '@/lib/openapi/answers/claim';
import { fileClaim } from '@/lib/services/claim/claim';
import { listClaims } from '@/lib/services/claim/list';

export const GET = route(listClaims, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The claims and cores of a case', answers: claimList },
});

export const POST = route(fileClaim, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Keep a claim that was sent', answers: claimWritten },
});
