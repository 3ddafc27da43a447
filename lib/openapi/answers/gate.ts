import { z } from 'zod';
import { count, id, instant, probability } from './common';
import { siteAnswer } from './record';

const text = z.string();

const gate = z.object({
  id,
  name: text,
  askWhom: text,
  createdBy: text,
  createdAt: instant,
  expiresAt: instant,
  state: z.enum(['open', 'revoked', 'expired']),
  passages: count.meta({ description: 'That ended with a verdict.' }),
});

export const gateList = z.object({ site: siteAnswer, gates: z.array(gate) }).meta({ id: 'GateList' });
export const gateWritten = z.object({ id, siteId: id });

const limits = z.object({ kind: z.literal('two-sided'), lower: z.number(), upper: z.number() });
const share = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('nothing-counted') }),
  z.object({ kind: z.literal('at-most'), of: count, upper: probability }),
  z.object({ kind: z.literal('count-alone'), count, of: count }),
  z.object({ kind: z.literal('estimated'), share: probability, count, of: count, limits }),
]);
const group = z.object({
  of: count.meta({ description: 'Fits that could be followed for the whole horizon.' }),
  cameBack: count,
  lost: count,
  tooRecent: count,
  claimPaid: count,
  paidAmount: z.number(),
  comebacks: share,
  claims: share,
});
const difference = z.object({ difference: z.number(), limits }).nullable().meta({ description: 'Gated less ungated, with Newcombe’s limits; null below five on a side.' });

export const gateOutcome = z
  .object({ currency: text, horizonDays: count, daysToFit: count, gated: group, saidFit: group, saidNotYet: group, ungated: group, comebackDifference: difference, claimDifference: difference })
  .meta({ id: 'GateOutcome' });
