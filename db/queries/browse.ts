import { and, asc, desc, eq, ilike, inArray, isNotNull, isNull, lt, sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { cases, compressorModel, person, site, unit } from '@/db/schema';
import { containing } from './like';

/** Lists for scripts: what comes after a row, in an order that stays as it is while rows are added. */
interface Browse {
  organisationId: string;
  limit: number;
}

const all = (conditions: (SQL | undefined | false | '')[]) => and(...conditions.filter((condition): condition is SQL => Boolean(condition)));

interface BrowseCases extends Browse {
  statuses?: string[];
  unitId?: string;
  siteId?: string;
  assignedTo?: string;
  /** The number of the case before. */
  after?: number;
}

/** The newest first: by their number, which only rises. */
export function browseCases(db: Executor, { organisationId, limit, statuses, unitId, siteId, assignedTo, after }: BrowseCases) {
  return db
    .select({
      id: cases.id,
      number: cases.number,
      status: cases.status,
      complaints: cases.complaints,
      openedAt: cases.openedAt,
      unitId: cases.unitId,
      fleetNumber: unit.fleetNumber,
      siteId: cases.siteId,
      siteName: site.name,
      assignedTo: cases.assignedTo,
      assignedToName: person.name,
      editionId: cases.editionId,
    })
    .from(cases)
    .innerJoin(unit, and(eq(unit.organisationId, cases.organisationId), eq(unit.id, cases.unitId)))
    .innerJoin(site, and(eq(site.organisationId, cases.organisationId), eq(site.id, cases.siteId)))
    .leftJoin(person, eq(person.id, cases.assignedTo))
    .where(
      all([
        eq(cases.organisationId, organisationId),
        statuses && inArray(cases.status, statuses),
        unitId && eq(cases.unitId, unitId),
        siteId && eq(cases.siteId, siteId),
        assignedTo && eq(cases.assignedTo, assignedTo),
        after !== undefined && lt(cases.number, after),
      ]),
    )
    .orderBy(desc(cases.number))
    .limit(limit);
}

interface BrowseUnits extends Browse {
  /** Part of a fleet number. */
  text: string;
  siteId?: string;
  hidden: boolean;
  after?: readonly [rank: number, fleetNumber: string, id: string];
}

/** The exact number first, then those that begin with the text; then by number. */
export function browseUnits(db: Executor, { organisationId, limit, text, siteId, hidden, after }: BrowseUnits) {
  const rank = sql<number>`case when lower(${unit.fleetNumber}) = lower(${text}) then 0 when ${unit.fleetNumber} ilike ${containing(text).slice(1)} then 1 else 2 end`;
  return db
    .select({ id: unit.id, fleetNumber: unit.fleetNumber, vehicleKind: unit.vehicleKind, siteId: unit.siteId, siteName: site.name, rank: rank.mapWith(Number) })
    .from(unit)
    .innerJoin(site, and(eq(site.organisationId, unit.organisationId), eq(site.id, unit.siteId)))
    .where(
      all([
        eq(unit.organisationId, organisationId),
        hidden ? isNotNull(unit.hiddenAt) : isNull(unit.hiddenAt),
        text && ilike(unit.fleetNumber, containing(text)),
        siteId && eq(unit.siteId, siteId),
        after && sql`(${rank}, ${unit.fleetNumber}, ${unit.id}) > (${after[0]}::int, ${after[1]}::text, ${after[2]}::uuid)`,
      ]),
    )
    .orderBy(asc(rank), asc(unit.fleetNumber), asc(unit.id))
    .limit(limit);
}

interface BrowseModels extends Browse {
  /** Part of a name. */
  text: string;
  hidden: boolean;
  after?: readonly [name: string, id: string];
}

export function browseModels(db: Executor, { organisationId, limit, text, hidden, after }: BrowseModels) {
  return db
    .select({
      id: compressorModel.id,
      name: compressorModel.name,
      displacementM3: compressorModel.displacementM3,
      cooling: compressorModel.cooling,
      intakeType: compressorModel.intakeType,
      drainOpening: compressorModel.drainOpening,
    })
    .from(compressorModel)
    .where(
      all([
        eq(compressorModel.organisationId, organisationId),
        hidden ? isNotNull(compressorModel.hiddenAt) : isNull(compressorModel.hiddenAt),
        text && ilike(compressorModel.name, containing(text)),
        after && sql`(${compressorModel.name}, ${compressorModel.id}) > (${after[0]}::text, ${after[1]}::uuid)`,
      ]),
    )
    .orderBy(asc(compressorModel.name), asc(compressorModel.id))
    .limit(limit);
}
