import { selectReleases } from '@/db/queries/release';
import { PERMITTED } from '@/lib/auth/permissions';
import { releaseChecks, whyNotReleased } from '@/lib/case/view/release';
import { releaseInput, type ReleaseView } from '@/lib/schemas/release';
import { gatherState } from '../case/gather-state';
import { standingHolds } from '../case/holds-of-unit';
import { defineRead } from '../define';
import { lastWorkOn } from './since';

/** What has to be measured before a unit is released after its repair, and how it stands. */
export const readRelease = defineRead({
  name: 'read.release',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: releaseInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<ReleaseView> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { caseHead, compiled, rows } = await gatherState(tx, ctx, { caseId });
    const checks = releaseChecks({ compiled, rows, since: await lastWorkOn(tx, of), units: ctx.person.units });
    const holds = (await standingHolds(tx, { ...of, unitId: caseHead.unitId })).filter(({ passedAt }) => passedAt === null);
    return {
      caseId,
      unitId: caseHead.unitId,
      checks,
      whyNot: whyNotReleased(checks),
      holds: [...new Set(holds.map(({ check }) => check))],
      mayRelease: ctx.mayRelease,
      releases: (await selectReleases(tx, of)).map(({ releasedAt, on, ...row }) => ({ ...row, releasedAt: releasedAt.toISOString(), on: on.map(({ name, answer }) => ({ name, answer })) })),
    };
  },
});
