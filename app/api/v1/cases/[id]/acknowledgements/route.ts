import { route } from '@/lib/auth/route';
import { acknowledged } from '@/lib/openapi/answers/case';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';

export const POST = route(acknowledgeCautions, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: {
    summary: 'Acknowledge the cautions of a check',
    description: 'Says that the person of the token read them: they hold for a day, and are acknowledged anew when the state becomes more dangerous.',
    answers: acknowledged,
  },
});
