import type { Transaction } from '@/db/connect';
import { selectLimitFacts, selectLimits } from '@/db/queries/limit';
import { limitsFor, type Limit } from '@/lib/limits';

interface Of {
  organisationId: string;
  caseId: string;
  /** Only that of one check. */
  checkId?: string;
}

/** The adopted limits that hold for a case's unit, by check. */
export async function limitsOfCase(tx: Transaction, of: Of): Promise<Map<string, Limit>> {
  const limits = await selectLimits(tx, of);
  if (limits.length === 0) return new Map();
  const facts = await selectLimitFacts(tx, of);
  return facts ? limitsFor(limits, facts) : new Map();
}
