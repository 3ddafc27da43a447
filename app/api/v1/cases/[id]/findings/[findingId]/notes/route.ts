import { route } from '@/lib/auth/route';
import { noteFinding } from '@/lib/services/case/note-finding';

export const POST = route(noteFinding, {
  status: 201,
  input: ({ params, body }) => ({ ...Object(body), caseId: params.id, findingId: params.findingId }),
});
