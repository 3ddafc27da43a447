import { and, asc, count, desc, eq, ilike, isNotNull, isNull, sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { site, unit } from '@/db/schema';
import { containing } from './like';
import { naturally } from './natural';

interface Of {
  organisationId: string;
  unitId: string;
}

const atItsSite = and(eq(site.organisationId, unit.organisationId), eq(site.id, unit.siteId));

const WHOLE = {
  id: unit.id,
  siteId: unit.siteId,
  siteName: site.name,
  timeZone: site.timeZone,
  fleetNumber: unit.fleetNumber,
  vocation: unit.vocation,
  country: unit.country,
  vehicleKind: unit.vehicleKind,
  builtOn: unit.builtOn,
  engineFamily: unit.engineFamily,
  reservoirM3: unit.reservoirM3,
  requiredReservoirM3: unit.requiredReservoirM3,
  reservoirCount: unit.reservoirCount,
  dryerCartridgeChangedOn: unit.dryerCartridgeChangedOn,
  asTyped: unit.asTyped,
  note: unit.note,
  createdAt: unit.createdAt,
  updatedAt: unit.updatedAt,
  hiddenAt: unit.hiddenAt,
};

/** A unit with its site; hidden ones too, because cases cite them. */
export async function selectUnit(db: Executor, { organisationId, unitId }: Of) {
  const [row] = await db
    .select(WHOLE)
    .from(unit)
    .innerJoin(site, atItsSite)
    .where(and(eq(unit.organisationId, organisationId), eq(unit.id, unitId)));
  return row;
}

export type UnitRow = NonNullable<Awaited<ReturnType<typeof selectUnit>>>;

/** By its number, however it is capitalised: two units "k-104" and "K-104" would be one on the yard. */
export async function selectUnitByNumber(db: Executor, { organisationId, fleetNumber }: { organisationId: string; fleetNumber: string }) {
  const [row] = await db
    .select({ id: unit.id, fleetNumber: unit.fleetNumber, hiddenAt: unit.hiddenAt })
    .from(unit)
    .where(and(eq(unit.organisationId, organisationId), sql`lower(${unit.fleetNumber}) = lower(${fleetNumber})`))
    .limit(1);
  return row;
}

/** The id of the new row; undefined when its id or its number is taken. */
export async function insertUnit(db: Executor, row: typeof unit.$inferInsert) {
  const [inserted] = await db.insert(unit).values(row).onConflictDoNothing().returning({ id: unit.id });
  return inserted;
}

export async function updateUnit(db: Executor, { organisationId, unitId }: Of, change: Partial<typeof unit.$inferInsert>): Promise<void> {
  await db.update(unit).set(change).where(and(eq(unit.organisationId, organisationId), eq(unit.id, unitId)));
}

/** Makes whoever else writes readings or fits of the unit wait until this transaction ends. */
export async function lockUnit(db: Executor, { organisationId, unitId }: Of): Promise<boolean> {
  const rows = await db
    .select({ id: unit.id })
    .from(unit)
    .where(and(eq(unit.organisationId, organisationId), eq(unit.id, unitId)))
    .for('update');
  return rows.length > 0;
}

export interface UnitFilter {
  organisationId: string;
  /** Part of a fleet number. */
  text?: string;
  siteId?: string;
  vocation?: string;
  vehicleKind?: string;
  hidden: boolean;
  sort: keyof typeof SORTED_BY;
  direction: 'asc' | 'desc';
  limit: number;
  offset: number;
}

const SORTED_BY = { number: naturally(unit.fleetNumber), site: site.name, kind: unit.vehicleKind, vocation: unit.vocation, built: unit.builtOn } as const;

export async function selectUnits(db: Executor, filter: UnitFilter) {
  const where = and(
    eq(unit.organisationId, filter.organisationId),
    filter.hidden ? isNotNull(unit.hiddenAt) : isNull(unit.hiddenAt),
    ...[
      filter.text && ilike(unit.fleetNumber, containing(filter.text)),
      filter.siteId && eq(unit.siteId, filter.siteId),
      filter.vocation && eq(unit.vocation, filter.vocation),
      filter.vehicleKind && eq(unit.vehicleKind, filter.vehicleKind),
    ].filter((condition): condition is SQL => Boolean(condition)),
  );
  const inDirection = filter.direction === 'asc' ? asc : desc;
  const rows = await db
    .select({
      id: unit.id,
      fleetNumber: unit.fleetNumber,
      vehicleKind: unit.vehicleKind,
      vocation: unit.vocation,
      builtOn: unit.builtOn,
      siteName: site.name,
    })
    .from(unit)
    .innerJoin(site, atItsSite)
    .where(where)
    .orderBy(inDirection(SORTED_BY[filter.sort]), asc(naturally(unit.fleetNumber)), asc(unit.id))
    .limit(filter.limit)
    .offset(filter.offset);
  const [total] = await db.select({ count: count() }).from(unit).where(where);
  return { rows, total: total?.count ?? 0 };
}
