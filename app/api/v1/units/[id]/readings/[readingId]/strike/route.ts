import { route } from '@/lib/auth/route';
import { readingWritten } from '@/lib/openapi/answers/record';
import { strikeReading } from '@/lib/services/unit/strike-reading';

export const POST = route(strikeReading, { params: { id: 'unitId' }, scope: 'units:write', doc: { summary: 'Strike out a wrong reading', answers: readingWritten } });
