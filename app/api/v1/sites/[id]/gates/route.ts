import { route } from '@/lib/auth/route';
import { gateList, gateWritten } from '@/lib/openapi/answers/gate';
import { listGates } from '@/lib/services/gate/list';
import { makeGate } from '@/lib/services/gate/links';

const params = { id: 'siteId' };

export const GET = route(listGates, {
  params,
  scope: 'sites:read',
  // A link lets its holder add to cases: a token that only reads isn't handed any.
  shape: ({ site, gates }) => ({ site, gates: gates.map(({ path: _, ...gate }) => gate) }),
  doc: { summary: 'List the gates of a site', description: 'Their links stand on the site’s page.', answers: gateList },
});

export const POST = route(makeGate, {
  params,
  scope: 'sites:write',
  status: 201,
  doc: { summary: 'Make a gate', description: 'A link with which anybody may ask whether a unit of the site is to get another compressor. It stands on the site’s page.', answers: gateWritten },
});
