import { expect, it } from 'vitest';
import { reminderOn } from '@/lib/services/watch/reminder';

it.each([
  ['UTC', '2026-07-01T05:45:00.000Z'],
  ['America/Chicago', '2026-07-01T10:45:00.000Z'],
  ['Asia/Kathmandu', '2026-07-01T00:00:00.000Z'],
  ['Pacific/Kiritimati', '2026-06-30T15:45:00.000Z'],
  ['Etc/GMT+12', '2026-07-01T17:45:00.000Z'],
])('a reminder in %s comes a quarter of an hour before six there', (timeZone, at) => expect(reminderOn('2026-07-01', timeZone).toISOString()).toBe(at));

it('a reminder moves with the clocks', () => {
  // They go forward in Chicago on 8 March 2026.
  expect(['2026-03-07', '2026-03-08'].map((day) => reminderOn(day, 'America/Chicago').toISOString())).toEqual(['2026-03-07T11:45:00.000Z', '2026-03-08T10:45:00.000Z']);
});
