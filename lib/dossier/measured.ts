import { formatQuantity, unitFor, type Quantity, type UnitId, type UnitPreferences } from '@/lib/units';

/** A figure of the record in the units of whoever makes the dossier; nothing where nobody knows it. */
export const measured = (si: number | null, quantity: Quantity, units: UnitPreferences, like?: UnitId): string | null =>
  si === null ? null : formatQuantity<Quantity>(si, { quantity, unit: unitFor<Quantity>(units, quantity, like) });
