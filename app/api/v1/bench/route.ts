import { route } from '@/lib/auth/route';
import { sumList } from '@/lib/openapi/answers/bench';
import { listSums } from '@/lib/services/bench/list';

export const GET = route(listSums, { scope: 'bench:read', doc: { summary: 'List the sums of the bench', answers: sumList } });
