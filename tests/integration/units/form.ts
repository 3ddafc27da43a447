import type { z } from 'zod';
import { newId } from '@/lib/ids';

/** A form of a new unit with nothing but what it must have. */
export const unitForm = (siteId: string, filled: object = {}) => ({
  id: newId(),
  fleetNumber: `T-${newId().slice(-8)}`,
  siteId,
  vehicleKind: 'truck' as const,
  ...filled,
});

export const modelForm = (filled: object = {}) => ({ id: newId(), name: `Model ${newId().slice(-8)}`, ...filled });

/** Fields as a form sends them: all text, and whatever somebody put in. */
export const sent = <Schema extends z.ZodType>(_to: { input: Schema }, fields: object) => fields as z.input<Schema>;
