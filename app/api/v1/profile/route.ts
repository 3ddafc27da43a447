import { route } from '@/lib/auth/route';
import { profileAnswer } from '@/lib/openapi/answers/profile';
import { myself } from '@/lib/services/person/myself';

export const GET = route(myself, { scope: 'profile:read', doc: { summary: 'Read who you are', description: 'And where, as what, and in which units of measure.', answers: profileAnswer } });
