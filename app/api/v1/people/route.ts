import { route } from '@/lib/auth/route';
import { peopleList } from '@/lib/openapi/answers/case';
import { browseAssignable } from '@/lib/services/case/browse-assignable';

export const GET = route(browseAssignable, { scope: 'people:read', doc: { summary: 'List who can be given a case', answers: peopleList } });
