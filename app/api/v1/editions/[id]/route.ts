import { route } from '@/lib/auth/route';
import { editionAnswer } from '@/lib/openapi/answers/device';
import { readEdition } from '@/lib/services/edition/read';

/** It never changes, so that a device asks for it once. */
const FOR_GOOD = { 'cache-control': 'private, max-age=31536000, immutable' };

export const GET = route(readEdition, {
  params: { id: 'editionId' },
  scope: 'cases:read',
  respond: (edition) => Response.json(edition, { headers: FOR_GOOD }),
  doc: { summary: 'Read an edition of the rulebook whole', description: 'With its rules; it never changes.', answers: editionAnswer },
});
