import { selectLiftedHolds } from '@/db/queries/unit-hold';
import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { unitIdInput } from '@/lib/schemas/unit';
import type { Transaction } from '@/db/connect';
import { standingHolds } from '../case/holds-of-unit';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';

/** What stands against a unit's release, and what stood and was lifted: by whom, on what, by which right. */
export const listHolds = defineRead({
  name: 'list.unit-hold',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: unitIdInput,
  run: async ({ tx, ctx, input: { unitId } }) => {
    const of = { organisationId: ctx.organisation.id, unitId };
    if (!(await selectUnit(tx, of))) throw notFound('unit');
    const standing = await standingHolds(tx, of);
    return {
      standing: standing.map(({ placedAt, passedAt, ...hold }) => ({ ...hold, placedAt: placedAt.toISOString(), passedAt: passedAt?.toISOString() ?? null })),
      lifted: await liftedHolds(tx, of),
    };
  },
});

export async function liftedHolds(tx: Transaction, of: { organisationId: string; unitId: string }) {
  const rows = await selectLiftedHolds(tx, of);
  return Promise.all(
    rows.map(async ({ editionId, checkId, endedAt, by, liftFound, liftBasis, liftJudgement, ...row }) => {
      const { checks } = await compiledEdition(tx, { ...of, editionId });
      return {
        ...row,
        checkId,
        check: checks.get(checkId)?.check.name ?? checkId,
        liftedAt: endedAt?.toISOString() ?? '',
        by,
        found: liftFound ?? '',
        basis: liftBasis,
        limitSource: liftJudgement?.limit.source ?? null,
      };
    }),
  );
}
