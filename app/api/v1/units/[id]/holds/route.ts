import { route } from '@/lib/auth/route';
import { holdList } from '@/lib/openapi/answers/limit';
import { listHolds } from '@/lib/services/unit-hold/list';

export const GET = route(listHolds, {
  params: { id: 'unitId' },
  scope: 'units:read',
  doc: { summary: 'What stands against its release', description: 'And what stood and was lifted: by whom, on what, by which right.', answers: holdList },
});
