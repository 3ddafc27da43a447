import { route } from '@/lib/auth/route';
import { releaseAnswer } from '@/lib/openapi/answers/fitting';
import { readRelease } from '@/lib/services/release/read';

export const GET = route(readRelease, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'What a release asks for', description: 'Each required check with how it stands, what stands against the unit, and the releases until now. Measure by a finding of the stage “release”.', answers: releaseAnswer },
});
