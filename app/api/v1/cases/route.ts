import { route } from '@/lib/auth/route';
import { listCases } from '@/lib/services/case/list';
import { openCase } from '@/lib/services/case/open';

export const GET = route(listCases);
export const POST = route(openCase, { status: 201 });
