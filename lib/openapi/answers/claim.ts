import { z } from 'zod';
import { CLAIM_STATES, CORE_STATES, type ClaimsView, type ClaimState, type CoreState } from '@/lib/schemas/claim';
import { day, id } from './common';

const money = z.number().nullable().meta({ description: 'In the organisation’s currency.' });
const claimStates = Object.keys(CLAIM_STATES) as [ClaimState, ...ClaimState[]];
const coreStates = Object.keys(CORE_STATES) as [CoreState, ...CoreState[]];

const claim = z.object({
  id,
  toWhom: z.string(),
  theirReference: z.string().nullable(),
  sentOn: day,
  amount: money,
  state: z.enum(claimStates),
  settledOn: day.nullable(),
  settledAmount: money,
  why: z.string().nullable(),
  createdBy: z.string(),
});

const core = z.object({
  id,
  fit: z.string().nullable(),
  fitId: id.nullable(),
  toWhom: z.string(),
  sentOn: day,
  expectedAmount: money,
  state: z.enum(coreStates),
  settledOn: day.nullable(),
  creditedAmount: money,
  why: z.string().nullable(),
  createdBy: z.string(),
});

export const claimList = z
  .object({ caseId: id, currency: z.string(), claims: z.array(claim), cores: z.array(core), fits: z.array(z.object({ id, name: z.string() })) })
  .meta({ id: 'ClaimList' }) satisfies z.ZodType<ClaimsView>;
export const claimWritten = z.object({ id, caseId: id });
