import { findSite } from '@/db/queries/site';
import { insertUnit, selectUnit, selectUnitByNumber } from '@/db/queries/unit';
import { conflict, invalid } from '@/lib/errors';
import type { Work } from '../define';

/** What a unit can be made from; whatever is left out isn't known. */
export interface NewUnit {
  id: string;
  fleetNumber: string;
  siteId: string;
  vehicleKind: 'truck' | 'bus';
  vocation?: string | null;
  /** The organisation's when it isn't said. */
  country?: string | null;
  builtOn?: string | null;
  engineFamily?: string | null;
  reservoirM3?: number | null;
  requiredReservoirM3?: number | null;
  reservoirCount?: number | null;
  dryerCartridgeChangedOn?: string | null;
  asTyped?: Record<string, string>;
  note?: string | null;
}

/** Adds a unit within a service's transaction. Sent twice (the same id), it adds one. */
export async function addUnit({ tx, ctx, audit, unchanged }: Work<unknown>, { id, fleetNumber, siteId, vehicleKind, country, ...optional }: NewUnit): Promise<{ id: string }> {
  const organisationId = ctx.organisation.id;
  if (await selectUnit(tx, { organisationId, unitId: id })) {
    unchanged();
    return { id };
  }
  await refuseUnknownSite({ tx, ctx }, siteId);
  await refuseTakenNumber({ tx, ctx }, { fleetNumber, unitId: id });

  const row = { fleetNumber, siteId, vehicleKind, country: country || ctx.organisation.country, ...optional };
  // Somebody else's, added since we looked.
  if (!(await insertUnit(tx, { ...row, organisationId, id, createdBy: ctx.person.id }))) throw taken(fleetNumber);
  audit({ entity: 'unit', entityId: id, changed: row });
  return { id };
}

/** @throws AppError "invalid" beside `siteId` */
export async function refuseUnknownSite({ tx, ctx }: Pick<Work<unknown>, 'tx' | 'ctx'>, siteId: string): Promise<void> {
  if (!(await findSite(tx, { organisationId: ctx.organisation.id, siteId }))) throw invalid({ siteId: 'This site does not exist. Choose another.' });
}

/** @throws AppError "conflict" beside `fleetNumber` when another unit has the number */
export async function refuseTakenNumber({ tx, ctx }: Pick<Work<unknown>, 'tx' | 'ctx'>, { fleetNumber, unitId }: { fleetNumber: string; unitId: string }): Promise<void> {
  const other = await selectUnitByNumber(tx, { organisationId: ctx.organisation.id, fleetNumber });
  if (other && other.id !== unitId) throw taken(other.fleetNumber, other.hiddenAt !== null);
}

function taken(fleetNumber: string, hidden = false) {
  const message = hidden
    ? `Unit ${fleetNumber} is in the list of hidden units. Show it again, or choose another number.`
    : `There is a unit ${fleetNumber} already.`;
  return conflict(message, { fleetNumber: message });
}
