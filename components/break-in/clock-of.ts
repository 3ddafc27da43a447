import type { Run } from '@/lib/break-in';
import type { BreakInRunView } from '@/lib/schemas/break-in';

/** A run as the arithmetic of its time takes it. @param events its own, or more that wait on this device */
export const clockOf = ({ startedAt, endedAt, events: own }: Pick<BreakInRunView, 'startedAt' | 'endedAt' | 'events'>, events = own): Run => ({
  startedAt: Date.parse(startedAt),
  endedAt: endedAt ? Date.parse(endedAt) : null,
  events: events.map(({ id, kind, at, pressurePa }) => ({ id, kind, at: Date.parse(at), pressurePa })),
});
