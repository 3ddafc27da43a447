import { route } from '@/lib/auth/route';
import { unitBaseline } from '@/lib/openapi/answers/baseline';
import { readBaseline } from '@/lib/services/baseline/read';

export const GET = route(readBaseline, {
  params: { id: 'unitId' },
  scope: 'units:read',
  doc: { summary: 'Read the healthy baseline of a unit', description: 'Its own sets, the pool of its model, and which of them counts for each figure.', answers: unitBaseline },
});
