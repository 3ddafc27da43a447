import { selectCases } from '@/db/queries/case';
import { selectLeaders } from '@/db/queries/run';
import { PERMITTED } from '@/lib/auth/permissions';
import { listCasesInput } from '@/lib/schemas/case';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';

export const CASES_A_PAGE = 50;

/** Cases by filter, with the cause that leads in each. */
export const listCases = defineRead({
  name: 'list.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: listCasesInput,
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const { rows, total } = await selectCases(tx, {
      organisationId,
      text: input.q || undefined,
      statuses: input.status === 'all' ? undefined : [input.status],
      siteId: input.site,
      assignedTo: input.mine ? ctx.person.id : undefined,
      sort: input.sort,
      direction: input.direction,
      limit: CASES_A_PAGE,
      offset: (input.page - 1) * CASES_A_PAGE,
    });
    const leaders = new Map((await selectLeaders(tx, { organisationId, caseIds: rows.map((row) => row.id) })).map((row) => [row.caseId, row]));
    const cases = await Promise.all(
      rows.map(async ({ editionId, openedAt, complaints, ...row }) => {
        const { rulebook, checks } = await compiledEdition(tx, { organisationId, editionId });
        const leader = leaders.get(row.id);
        return {
          ...row,
          openedAt: openedAt.toISOString(),
          complaints: complaints.map((id) => checks.get(id)?.check.name ?? id),
          leader: leader ? { name: rulebook.causes.find((cause) => cause.id === leader.causeId)?.name ?? leader.causeId, p: leader.p } : null,
        };
      }),
    );
    return { cases, total, page: input.page, pages: Math.max(1, Math.ceil(total / CASES_A_PAGE)) };
  },
});
