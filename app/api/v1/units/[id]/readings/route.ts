import { route } from '@/lib/auth/route';
import { readingList, readingWritten } from '@/lib/openapi/answers/record';
import { addReading } from '@/lib/services/unit/add-reading';
import { browseReadings } from '@/lib/services/unit/browse-of-unit';

const params = { id: 'unitId' };

export const GET = route(browseReadings, { params, scope: 'units:read', doc: { summary: 'List the readings of a unit', description: 'By date; struck-out ones are left out.', answers: readingList } });

export const POST = route(addReading, {
  params,
  scope: 'units:write',
  status: 201,
  doc: { summary: 'Add a reading', description: 'Odometer, engine hours, or both, of a day. Each with its unit, or in yours.', answers: readingWritten },
});
