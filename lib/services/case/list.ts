import { selectCaseList } from '@/db/queries/case-list';
import { selectLeaders } from '@/db/queries/run';
import { siteDay } from '@/lib/case/site-day';
import { PERMITTED } from '@/lib/auth/permissions';
import { listCasesInput } from '@/lib/schemas/case';
import { ROWS_A_PAGE } from '@/lib/schemas/list';
import { daysBetween } from '../days';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';
import { holdsByUnit } from './holds-of-unit';

/** Cases by filter: what stands where, whose, since when, which cause leads, and whether the unit may be released. */
export const listCases = defineRead({
  name: 'list.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: listCasesInput,
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const { rows, total } = await selectCaseList(tx, {
      organisationId,
      text: input.q || undefined,
      statuses: statusesOf(input.status),
      siteId: input.site,
      assignedTo: input.whose === 'me' ? ctx.person.id : input.whose === 'nobody' ? null : input.whose,
      complaint: input.complaint,
      held: input.held === 'yes',
      sort: input.sort,
      direction: input.direction,
      limit: ROWS_A_PAGE,
      offset: (input.page - 1) * ROWS_A_PAGE,
    });
    const leaders = new Map((await selectLeaders(tx, { organisationId, caseIds: rows.map((row) => row.id) })).map((row) => [row.caseId, row]));
    const holds = await holdsByUnit(tx, { organisationId, unitIds: [...new Set(rows.map((row) => row.unitId))] });
    const cases = await Promise.all(
      rows.map(async ({ editionId, openedAt, closedAt, activeAt, complaints, timeZone, ...row }) => {
        const { rulebook, checks } = await compiledEdition(tx, { organisationId, editionId });
        const leader = leaders.get(row.id);
        const openedOn = siteDay(openedAt, timeZone);
        return {
          ...row,
          timeZone,
          openedOn,
          /** Days that the unit has stood, or stood until the case was closed. */
          days: daysBetween(openedOn, siteDay(closedAt ?? ctx.now(), timeZone)),
          activeAt: activeAt.toISOString(),
          complaints: complaints.map((id) => checks.get(id)?.check.name ?? id),
          leader: leader ? { name: rulebook.causes.find((cause) => cause.id === leader.causeId)?.name ?? leader.causeId, p: leader.p } : null,
          /** Names of the checks, of any case of the unit, that forbid its release. */
          holds: holds.get(row.unitId) ?? [],
        };
      }),
    );
    return { cases, query: input, total, pages: Math.max(1, Math.ceil(total / ROWS_A_PAGE)) };
  },
});
export type CaseList = Awaited<ReturnType<typeof listCases>>;

function statusesOf(status: string): string[] | undefined {
  if (status === 'all') return undefined;
  return status === 'standing' ? ['open', 'called'] : [status];
}
