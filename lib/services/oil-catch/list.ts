import { selectCaseHead } from '@/db/queries/case';
import { selectCatches, selectWeighings, type WeighingRow } from '@/db/queries/oil-catch';
import { sumOf } from '@/lib/air-and-oil/sums';
import { workOut } from '@/lib/bench/work-out';
import { isCaught, SUM_BY_WEIGHT, textsOfWeighings, WRITTEN_HERE, type Weighed } from '@/lib/case/weighings';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { caseOnly } from '@/lib/schemas/oil-catch';
import type { Transaction } from '@/db/connect';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';

/** The oil that is or was caught for a case, and the checks that it could be caught for. Measures are SI. */
export const listCatches = defineRead({
  name: 'list.oil-catch',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: caseOnly,
  run: async ({ tx, ctx, input: { caseId } }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const head = await selectCaseHead(tx, of);
    if (!head) throw notFound('case');
    const { checks } = await compiledEdition(tx, { ...of, editionId: head.editionId });
    return {
      caseId,
      checks: [...checks.values()].filter(({ check }) => isCaught(check)).map(({ check: { id, name } }) => ({ id, name })),
      catches: (await catchesOf(tx, of)).map((one) => ({ ...one, check: checks.get(one.checkId)?.check.name ?? one.checkId })),
    };
  },
});
export type CaseCatches = Awaited<ReturnType<typeof listCatches>>;

async function catchesOf(tx: Transaction, of: { organisationId: string; caseId: string }) {
  const catches = await selectCatches(tx, of);
  const weighings = await selectWeighings(tx, { ...of, catchIds: catches.map(({ id }) => id) });
  return catches.map(({ startedAt, remindAt, endedAt, ...one }) => {
    const own = weighings.filter(({ catchId }) => catchId === one.id);
    const standing = own.filter(({ takenBackAt }) => takenBackAt === null);
    return {
      ...one,
      startedAt: startedAt.toISOString(),
      remindAt: remindAt?.toISOString() ?? null,
      endedAt: endedAt?.toISOString() ?? null,
      weighings: own.map(weighingView),
      /** Of all that stand together. */
      perHour: standing.length > 0 ? rateOf(standing) : null,
    };
  });
}

function weighingView({ catchId: _, takenBackFindingId: __, takenBackAt, takenBackBy, takenBackWhy, at, ...weighing }: WeighingRow) {
  return {
    ...weighing,
    at: at.toISOString(),
    perHour: rateOf([weighing]),
    takenBack: takenBackAt && { at: takenBackAt.toISOString(), by: takenBackBy ?? '', why: takenBackWhy ?? '' },
  };
}

/** Oil per hour with its doubt, as the finding has it: by the same sum from the same texts. */
function rateOf(weighed: readonly Weighed[]): { si: number; low: number | null; high: number | null } | null {
  const sum = sumOf(SUM_BY_WEIGHT);
  const worked = sum && workOut(sum, textsOfWeighings(weighed), WRITTEN_HERE, 'perHour');
  if (worked?.kind !== 'values' || worked.values.perHour === undefined) return null;
  return { si: worked.values.perHour, low: worked.band?.low ?? null, high: worked.band?.high ?? null };
}
