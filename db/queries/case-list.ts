import { and, asc, count, desc, eq, exists, ilike, inArray, isNull, or, sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { caseEvent, cases, finding, person, site, unit, unitHold } from '@/db/schema';
import { containing } from './like';
import { naturally } from './natural';

export interface CaseFilter {
  organisationId: string;
  /** Part of a fleet number, or a case number. */
  text?: string;
  statuses?: string[];
  siteId?: string;
  /** A person's id; null: given to nobody. */
  assignedTo?: string | null;
  /** Id of the check that the complaint is. */
  complaint?: string;
  /** Only those of units that aren't to be released. */
  held: boolean;
  sort: 'opened' | 'number' | 'unit' | 'site' | 'active';
  direction: 'asc' | 'desc';
  limit: number;
  offset: number;
}

/** When something last happened to a case: an answer came, or it was called, given to somebody, closed. */
const activeAt = sql<Date>`greatest(
  ${cases.openedAt},
  (select max(${finding.receivedAt}) from ${finding} where ${finding.organisationId} = ${cases.organisationId} and ${finding.caseId} = ${cases.id}),
  (select max(${caseEvent.at}) from ${caseEvent} where ${caseEvent.organisationId} = ${cases.organisationId} and ${caseEvent.caseId} = ${cases.id})
)`.mapWith(cases.openedAt);

const SORTED_BY = { opened: cases.openedAt, number: cases.number, unit: naturally(unit.fleetNumber), site: site.name, active: activeAt } as const;

export async function selectCaseList(db: Executor, filter: CaseFilter) {
  const where = and(
    eq(cases.organisationId, filter.organisationId),
    ...[
      filter.statuses && inArray(cases.status, filter.statuses),
      filter.siteId && eq(cases.siteId, filter.siteId),
      filter.assignedTo === null ? isNull(cases.assignedTo) : filter.assignedTo && eq(cases.assignedTo, filter.assignedTo),
      filter.complaint && sql`${filter.complaint} = any(${cases.complaints})`,
      filter.held && unitIsHeld(db),
      filter.text && or(ilike(unit.fleetNumber, containing(filter.text)), sql`${cases.number}::text = ${filter.text.replace(/^#/, '')}`),
    ].filter((condition): condition is SQL => Boolean(condition)),
  );
  const inDirection = filter.direction === 'asc' ? asc : desc;
  const rows = await db
    .select({
      id: cases.id,
      number: cases.number,
      status: cases.status,
      complaints: cases.complaints,
      openedAt: cases.openedAt,
      closedAt: cases.closedAt,
      activeAt,
      odometerM: cases.odometerM,
      fleetNumber: unit.fleetNumber,
      unitId: cases.unitId,
      siteName: site.name,
      timeZone: site.timeZone,
      assignedTo: person.name,
      editionId: cases.editionId,
    })
    .from(cases)
    .innerJoin(unit, itsUnit)
    .innerJoin(site, and(eq(site.organisationId, cases.organisationId), eq(site.id, cases.siteId)))
    .leftJoin(person, eq(person.id, cases.assignedTo))
    .where(where)
    .orderBy(inDirection(SORTED_BY[filter.sort]), desc(cases.id))
    .limit(filter.limit)
    .offset(filter.offset);
  const [total] = await db.select({ count: count() }).from(cases).innerJoin(unit, itsUnit).where(where);
  return { rows, total: total?.count ?? 0 };
}

const itsUnit = and(eq(unit.organisationId, cases.organisationId), eq(unit.id, cases.unitId));

/** Whether anything stands against the release of the case's unit: this case need not be what found it. */
function unitIsHeld(db: Executor): SQL {
  return exists(
    db
      .select({ one: sql`1` })
      .from(unitHold)
      .where(and(eq(unitHold.organisationId, cases.organisationId), eq(unitHold.unitId, cases.unitId), isNull(unitHold.endedAt))),
  );
}
