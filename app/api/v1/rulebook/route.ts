import { route } from '@/lib/auth/route';
import { rulebookAnswer } from '@/lib/openapi/answers/rulebook';
import { viewRulebook } from '@/lib/services/edition/view';

export const GET = route(viewRulebook, {
  scope: 'cases:read',
  doc: { summary: 'Read what is asked', description: 'Complaints, checks, causes and cautions of the edition that new cases are opened with.', answers: rulebookAnswer },
});
