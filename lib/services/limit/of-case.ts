import type { Transaction } from '@/db/connect';
import { selectLimitFacts, selectLimits } from '@/db/queries/limit';
import { limitsFor, type AdoptedLimit, type Limit } from '@/lib/limits';

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
  return facts ? onlyLimits(limitsFor(limits.map(adopted), facts)) : new Map();
}

export const adopted = ({ adoptedAt, ...limit }: Awaited<ReturnType<typeof selectLimits>>[number]): AdoptedLimit => ({ ...limit, adoptedAt: adoptedAt.toISOString() });

/** What is kept with a judgement: the limit itself, not whom else it is for. */
export const onlyLimits = (limits: ReadonlyMap<string, AdoptedLimit>): Map<string, Limit> =>
  new Map([...limits].map(([id, { id: limitId, checkId, least, most, below, source }]) => [id, { id: limitId, checkId, least, most, below, source }]));
