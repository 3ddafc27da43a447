import { route } from '@/lib/auth/route';
import { fitWritten } from '@/lib/openapi/answers/record';
import { takeOutFit } from '@/lib/services/fit/change';

export const POST = route(takeOutFit, {
  params: { id: 'fitId' },
  scope: 'units:write',
  ifMatch: 'needed',
  doc: { summary: 'Take a compressor off its unit', answers: fitWritten },
});
