import { caseStream } from '@/lib/auth/case-stream';
import { route } from '@/lib/auth/route';
import { watchCase } from '@/lib/services/case/watch';

export const GET = route(watchCase, {
  input: ({ params, query }) => ({ ...query, caseId: params.id }),
  respond: (of, request) => caseStream(of, request.signal),
});
