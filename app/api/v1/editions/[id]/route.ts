import { route } from '@/lib/auth/route';
import { readEdition } from '@/lib/services/edition/read';

/** It never changes, so that a device asks for it once. */
const FOR_GOOD = { 'cache-control': 'private, max-age=31536000, immutable' };

export const GET = route(readEdition, {
  input: ({ params, query }) => ({ ...query, editionId: params.id }),
  respond: (edition) => Response.json(edition, { headers: FOR_GOOD }),
});
