import { browseCases as selectCases } from '@/db/queries/browse';
import { selectLeaders } from '@/db/queries/run';
import { PERMITTED } from '@/lib/auth/permissions';
import { browseCasesInput, cutPage } from '@/lib/schemas/browse';
import { defineRead } from '../define';

/** Cases one page after another, the newest first, with the cause that leads in each. */
export const browseCases = defineRead({
  name: 'browse.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: browseCasesInput,
  run: async ({ tx, ctx, input: { status, unit, site, mine, limit, cursor } }) => {
    const organisationId = ctx.organisation.id;
    const found = await selectCases(tx, {
      organisationId,
      limit: limit + 1,
      statuses: status === 'all' ? undefined : [status],
      unitId: unit,
      siteId: site,
      assignedTo: mine ? ctx.person.id : undefined,
      after: cursor?.[0],
    });
    const { rows, next } = cutPage(found, { limit, keysOf: ({ number }) => [number] });
    const leaders = new Map((await selectLeaders(tx, { organisationId, caseIds: rows.map(({ id }) => id) })).map(({ caseId, causeId, p }) => [caseId, { causeId, p }]));
    return { cases: rows.map((row) => ({ ...row, leader: leaders.get(row.id) ?? null })), next };
  },
});
