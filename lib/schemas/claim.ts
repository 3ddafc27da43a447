import { z } from 'zod';
import { line, optionalId, optionalLine, rowId } from './common';
import { optionalAmount } from './money';
import { day } from './record';

/** Where a claim stands, and what came of a core, as they are kept and as they are said. */
export const CLAIM_STATES = { sent: 'Sent', paid: 'Paid', 'part-paid': 'Paid in part', denied: 'Denied' } as const;
export type ClaimState = keyof typeof CLAIM_STATES;
export const CORE_STATES = { sent: 'Sent', credited: 'Credited', refused: 'Refused' } as const;
export type CoreState = keyof typeof CORE_STATES;

export const claimsOfCaseInput = z.strictObject({ caseId: rowId });

export const fileClaimInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  toWhom: line('to whom it went', 120),
  theirReference: optionalLine(120),
  sentOn: day('the day on which it was sent'),
  amount: optionalAmount,
});

export const settleClaimInput = z.strictObject({
  caseId: rowId,
  claimId: rowId,
  state: z.enum(['paid', 'part-paid', 'denied'], 'Say what came of it.'),
  settledOn: day('the day on which they said so'),
  settledAmount: optionalAmount,
  why: optionalLine(500),
});

export const sendCoreInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  /** The compressor that went back, where it is in the record. */
  whichFit: optionalId,
  toWhom: line('to whom it went', 120),
  sentOn: day('the day on which it was sent'),
  expectedAmount: optionalAmount,
});

export const settleCoreInput = z.strictObject({
  caseId: rowId,
  coreId: rowId,
  state: z.enum(['credited', 'refused'], 'Say what came of it.'),
  settledOn: day('the day on which they said so'),
  creditedAmount: optionalAmount,
  why: optionalLine(500),
});

export interface ClaimView {
  id: string;
  toWhom: string;
  theirReference: string | null;
  sentOn: string;
  amount: number | null;
  state: ClaimState;
  settledOn: string | null;
  settledAmount: number | null;
  why: string | null;
  createdBy: string;
}

export interface CoreView {
  id: string;
  /** "Model, fitted 2 Jan 2026" */
  fit: string | null;
  fitId: string | null;
  toWhom: string;
  sentOn: string;
  expectedAmount: number | null;
  state: CoreState;
  settledOn: string | null;
  creditedAmount: number | null;
  why: string | null;
  createdBy: string;
}

export interface ClaimsView {
  caseId: string;
  currency: string;
  claims: ClaimView[];
  cores: CoreView[];
  /** Compressors of the unit that can have gone back. */
  fits: { id: string; name: string }[];
}
