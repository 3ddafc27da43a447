import { route } from '@/lib/auth/route';
import { gateList, gateWritten } from '@/lib/openapi/answers/gate';
import { listGates } from '@/lib/services/gate/list';
import { makeGate } from '@/lib/services/gate/links';

const params = { id: 'siteId' };

export const GET = route(listGates, { params, scope: 'sites:write', doc: { summary: 'List the gates of a site', description: 'Each with where its link leads, which is a secret.', answers: gateList } });

export const POST = route(makeGate, {
  params,
  scope: 'sites:write',
  status: 201,
  doc: { summary: 'Make a gate', description: 'A link with which anybody may ask whether a unit of the site is to get another compressor. Its path stands in the list.', answers: gateWritten },
});
