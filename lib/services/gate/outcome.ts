import { selectGateOutcome, type GateOutcomeRow } from '@/db/queries/gate-outcome';
import { PERMITTED } from '@/lib/auth/permissions';
import { honestShare, LEAST_FAILURES } from '@/lib/reliability/honesty';
import { riskDifference, type CountOf } from '@/lib/reliability/practices/risk-difference';
import { DAYS_FROM_PASSAGE_TO_FIT, gateOutcomeInput } from '@/lib/schemas/gate';
import { defineRead } from '../define';

export const HORIZON_DAYS = 90;

const NONE = { of: 0, cameBack: 0, lost: 0, tooRecent: 0, claimPaid: 0, paidAmount: 0 };
type Counts = typeof NONE;

const together = (rows: readonly GateOutcomeRow[]): Counts =>
  rows.reduce((sum, row) => ({ of: sum.of + row.of, cameBack: sum.cameBack + row.cameBack, lost: sum.lost + row.lost, tooRecent: sum.tooRecent + row.tooRecent, claimPaid: sum.claimPaid + row.claimPaid, paidAmount: sum.paidAmount + row.paidAmount }), NONE);

const groupOf = (counts: Counts) => ({ ...counts, comebacks: honestShare(counts.cameBack, counts.of), claims: honestShare(counts.claimPaid, counts.of) });

/** Newcombe's, from five on each side; below that nobody would be served by it. */
function differenceOf(gated: CountOf, ungated: CountOf) {
  if (Math.min(gated.count, ungated.count) < LEAST_FAILURES) return null;
  const difference = riskDifference(gated, ungated);
  return difference.kind === 'estimated' ? { difference: difference.difference, limits: difference.limits } : null;
}

/** How fits went that came through the gate and those that came past it: come back within 90 days, and claims paid. */
export const readGateOutcome = defineRead({
  name: 'read.gate-outcome',
  doing: 'see fleet statistics',
  roles: PERMITTED['fleet.see'],
  input: gateOutcomeInput,
  run: async ({ tx, ctx }) => {
    const rows = await selectGateOutcome(tx, { organisationId: ctx.organisation.id, today: ctx.now().toISOString().slice(0, 10), horizonDays: HORIZON_DAYS, daysToFit: DAYS_FROM_PASSAGE_TO_FIT });
    const [gated, ungated] = [together(rows.filter(({ verdict }) => verdict !== null)), together(rows.filter(({ verdict }) => verdict === null))];
    return {
      currency: ctx.organisation.currency,
      horizonDays: HORIZON_DAYS,
      daysToFit: DAYS_FROM_PASSAGE_TO_FIT,
      gated: groupOf(gated),
      saidFit: groupOf(together(rows.filter(({ verdict }) => verdict === 'fit'))),
      saidNotYet: groupOf(together(rows.filter(({ verdict }) => verdict === 'not-yet'))),
      ungated: groupOf(ungated),
      /** Gated less ungated; null: fewer than five on a side. */
      comebackDifference: differenceOf({ count: gated.cameBack, of: gated.of }, { count: ungated.cameBack, of: ungated.of }),
      claimDifference: differenceOf({ count: gated.claimPaid, of: gated.of }, { count: ungated.claimPaid, of: ungated.of }),
    };
  },
});

export type GateOutcome = Awaited<ReturnType<typeof readGateOutcome>>;
