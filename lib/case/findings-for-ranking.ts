import type { Finding } from '@/lib/diagnose/types';
import { standingFindings } from './current-findings';
import type { FindingRow } from './rows';

type Row = Pick<FindingRow, 'id' | 'checkId' | 'stage' | 'source' | 'shares' | 'reliability' | 'kind' | 'correctedAt' | 'receivedAt'>;

/** The answers that stand as the ranker takes them, in an order that doesn't depend on when they came. */
export function findingsForRanking(rows: readonly Row[]): Finding[] {
  return standingFindings(rows)
    .map(({ id, checkId, stage, shares, reliability }) => ({ id, checkId, stage, shares, reliability }))
    .sort((a, b) => (a.id < b.id ? -1 : 1));
}
